import { bareConditions } from '$lib/model/team/datasets/conditions';
import { dataset, device, event, firmwareVersion } from '$lib/server/db/schema';
import { bulkEdit } from '$lib/server/services/datasets/bulk-edit';
import { editConditions } from '$lib/server/services/datasets/edit-conditions';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { moveVersion } from '$lib/server/services/devices/move-version';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { noteDevice } from '$lib/server/services/devices/note-device';
import { readDevice } from '$lib/server/services/devices/read-device';
import { removeVersion } from '$lib/server/services/devices/remove-version';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { LONG_TABLE, setting, store, wholeFile } from '../datasets/support';

/** A team with two devices of two versions each, saved from one file. */
function withDevices() {
  const people = setting();
  const { db, lead } = people;
  const saved = saveDatasets(db, lead, wholeFile(db, lead, store(db, lead, LONG_TABLE)), 5);
  if (!saved.ok) throw new Error(saved.reason);
  const [kelp, marram] = listDevices(db, lead);
  const device = (id = kelp.id, actor = lead) => {
    const found = readDevice(db, actor, id);
    if (!found.ok) throw new Error(found.reason);
    return found.device;
  };
  return { ...people, kelp, marram, device, saved: saved.saved };
}

const unknown = { ok: false, reason: 'unknown' };

describe('devices and their versions', () => {
  it('come with the datasets that name them, in the order of arrival, once', () => {
    const { db, lead, kelp, device } = withDevices();
    expect(listDevices(db, lead)).toMatchObject([
      { name: 'Kelp', versions: 2, datasets: 2, newest: 'ebb 3.2' },
      { name: 'Marram', versions: 2, datasets: 2, newest: 'ebb 3.2' }
    ]);
    expect(device().versions).toMatchObject([
      { name: 'ebb 3.1', datasets: 1, aside: 0, last: 5 },
      { name: 'ebb 3.2', datasets: 1, aside: 0, last: 5 }
    ]);
    nameKnownDevices(db);
    expect(db.select().from(firmwareVersion).where(eq(firmwareVersion.deviceId, kelp.id)).all()).toHaveLength(
      2
    );
    db.$client.close();
  });

  it('come with an edit and with an edit of many, and stay when nothing names them any more', () => {
    const { db, lead } = setting();
    const id = makeDataset(db, lead);
    const named = { ...bareConditions('made'), device: 'Kelp', firmware: 'ebb 3.1' };
    editConditions(db, lead, id, { version: 1, conditions: named });
    expect(listDevices(db, lead)).toMatchObject([{ name: 'Kelp', versions: 1, datasets: 1 }]);
    bulkEdit(db, lead, { datasets: [id], set: { firmware: 'ebb 3.2' } });
    expect(listDevices(db, lead)).toMatchObject([{ name: 'Kelp', versions: 2, newest: 'ebb 3.2' }]);
    bulkEdit(db, lead, { datasets: [id], set: { device: 'Marram', firmware: null } });
    expect(listDevices(db, lead)).toMatchObject([
      { name: 'Kelp', versions: 2, datasets: 0 },
      { name: 'Marram', versions: 0, datasets: 1, newest: null }
    ]);
    // A firmware version of no device is nobody's.
    bulkEdit(db, lead, { datasets: [id], set: { device: null, firmware: 'ebb 4' } });
    expect(listDevices(db, lead)).toHaveLength(2);
    db.$client.close();
  });

  it('are given to datasets of before, oldest first', () => {
    const { db, lead } = setting();
    makeDataset(db, lead, { device: 'Kelp', firmware: 'b', createdAt: 2 });
    makeDataset(db, lead, { device: 'Kelp', firmware: 'a', createdAt: 3 });
    makeDataset(db, lead, { device: 'Kelp', firmware: 'z', createdAt: 1, deletedAt: 4 });
    makeDataset(db, lead, { device: 'Kelp', firmware: null, createdAt: 3 });
    expect(db.select().from(device).all()).toHaveLength(0);
    nameKnownDevices(db);
    const [{ id }] = listDevices(db, lead);
    const read = readDevice(db, lead, id);
    expect(read).toMatchObject({ ok: true, device: { unversioned: 1 } });
    expect(
      read.ok && read.device.versions.map(({ name, datasets, aside }) => [name, datasets, aside])
    ).toEqual([
      ['z', 0, 1],
      ['b', 1, 0],
      ['a', 1, 0]
    ]);
    db.$client.close();
  });

  it('move by one place, and the second of two editors is told', () => {
    const { db, lead, experimenter, kelp, device } = withDevices();
    const [first, second] = device().versions;
    const move = { versionId: second.id, by: -1, version: 1 } as const;
    expect(moveVersion(db, experimenter, kelp.id, move)).toEqual({ ok: true, name: 'ebb 3.2', version: 2 });
    expect(device().versions.map(({ id }) => id)).toEqual([second.id, first.id]);
    expect(moveVersion(db, lead, kelp.id, move)).toEqual({ ok: false, reason: 'stale' });
    expect(moveVersion(db, lead, kelp.id, { ...move, version: 2 })).toEqual({ ok: false, reason: 'no-way' });
    expect(db.select().from(event).where(eq(event.action, 'device.order')).all()).toHaveLength(1);
    db.$client.close();
  });

  it('have notes, each of its own', () => {
    const { db, lead, kelp, device } = withDevices();
    const [first] = device().versions;
    expect(noteDevice(db, lead, kelp.id, { versionId: null, notes: 'Warm.', version: 1 })).toEqual({
      ok: true,
      version: 2
    });
    const edit = { versionId: first.id, notes: 'New pulses.', version: 2 };
    expect(noteDevice(db, lead, kelp.id, edit)).toEqual({ ok: true, version: 3 });
    expect(noteDevice(db, lead, kelp.id, edit), 'pressed twice').toEqual({ ok: true, version: 3 });
    expect(noteDevice(db, lead, kelp.id, { ...edit, notes: 'Other.' })).toEqual({
      ok: false,
      reason: 'stale'
    });
    expect(device()).toMatchObject({ notes: 'Warm.', versions: [{ notes: 'New pulses.' }, { notes: null }] });
    db.$client.close();
  });

  it('lose a version only when no dataset names it, not even one put aside', () => {
    const { db, lead, kelp, device } = withDevices();
    const [first] = device().versions;
    const named = { ok: false, reason: 'named' };
    expect(removeVersion(db, lead, kelp.id, first.id)).toEqual(named);
    db.update(dataset).set({ deletedAt: 9 }).where(eq(dataset.firmware, first.name)).run();
    expect(removeVersion(db, lead, kelp.id, first.id)).toEqual(named);
    db.update(dataset).set({ firmware: null }).where(eq(dataset.firmware, first.name)).run();
    expect(removeVersion(db, lead, kelp.id, first.id)).toEqual({ ok: true, name: 'ebb 3.1' });
    expect(device()).toMatchObject({ version: 2, versions: [{ name: 'ebb 3.2' }] });
    db.$client.close();
  });

  it('are nobody’s of another team, and an observer’s to see alone', () => {
    const { db, observer, stranger, lead, kelp, marram, device } = withDevices();
    const [{ id: versionId }] = device().versions;
    expect(readDevice(db, observer, kelp.id)).toMatchObject({ ok: true });
    expect(listDevices(db, stranger)).toEqual([]);
    const crossed = { ...stranger, teamId: lead.teamId };
    expect(listDevices(db, crossed)).toEqual([]);
    for (const actor of [stranger, crossed]) expect(readDevice(db, actor, kelp.id)).toEqual(unknown);
    for (const actor of [observer, stranger, crossed]) {
      expect(moveVersion(db, actor, kelp.id, { versionId, by: 1, version: 1 })).toEqual(unknown);
      expect(noteDevice(db, actor, kelp.id, { versionId, notes: 'x', version: 1 })).toEqual(unknown);
      expect(noteDevice(db, actor, kelp.id, { versionId: null, notes: 'x', version: 1 })).toEqual(unknown);
      expect(removeVersion(db, actor, kelp.id, versionId)).toEqual(unknown);
    }
    // A version of one device is none of another.
    expect(moveVersion(db, lead, marram.id, { versionId, by: 1, version: 1 })).toEqual(unknown);
    expect(noteDevice(db, lead, marram.id, { versionId, notes: 'x', version: 1 })).toEqual(unknown);
    expect(removeVersion(db, lead, marram.id, versionId)).toEqual(unknown);
    db.$client.close();
  });
});
