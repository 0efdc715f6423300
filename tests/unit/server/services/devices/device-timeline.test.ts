import { dataset, gateRule } from '$lib/server/db/schema';
import { newId } from '$lib/server/db/new-id';
import { compareVersions } from '$lib/server/services/devices/compare-versions';
import { deviceTimeline } from '$lib/server/services/devices/device-timeline';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { moveVersion } from '$lib/server/services/devices/move-version';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { setting } from '../datasets/support';

/** Invented: equal trials of 64 sites of rate 0.1; those of more rates have more variance than any of one mean. */
function counts(seed: number, rates = [0.1], shots = 5000): string {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (const rate of rates) {
    const { first, values } = binomialWindow(64, rate, 1e-18, 1);
    const into = new Float64Array(values.length);
    histogramSampler(values).draw(random, shots / rates.length, into);
    into.forEach((h, i) => h > 0 && seen.set(first + i, (seen.get(first + i) ?? 0) + h));
  }
  const rows = [...seen].sort(([a], [b]) => a - b);
  return JSON.stringify({ kind: 'histogram', counts: rows, lump: null });
}

function device() {
  const made = setting();
  const { db, lead } = made;
  const save = (firmware: string, group: string | null, at: number, rates?: number[]) =>
    makeDataset(db, lead, {
      device: 'Kelp',
      firmware,
      group,
      createdAt: at,
      trials: 64,
      counts: counts(at, rates)
    });
  const named = () => {
    nameKnownDevices(db);
    return listDevices(db, lead)[0].id;
  };
  const open = async (id: string, reference: string | null = null, group: string | null = null) => {
    const read = await deviceTimeline(db, lead, id, { reference, group });
    if (!read.ok) throw new Error(read.reason);
    return read.timeline;
  };
  return { ...made, save, named, open };
}

describe('the timeline of a device', () => {
  it('holds every version against the first, and draws the group that rose most clearly', async () => {
    const { db, lead, save, named, open } = device();
    for (const [j, firmware] of ['a', 'b', 'c'].entries())
      for (const [i, group] of ['q1', 'q2'].entries())
        save(firmware, group, 1 + 2 * j + i, firmware === 'c' && group === 'q2' ? [0.06, 0.14] : undefined);
    const newest = db.select().from(dataset).where(eq(dataset.createdAt, 6)).get()!;
    makeReport(db, lead, newest.id, {
      document: JSON.stringify({ fit: { divergenceInterval: { value: 0.02, low: 0.01, high: 0.03 } } })
    });
    const drawn = await open(named());
    expect(drawn).toMatchObject({ reference: 'a', group: 'q2', groups: ['q1', 'q2'], goneReference: null });
    expect(drawn.marks[1].map((cell) => cell?.mark)).toEqual(['reference', 'no-difference-seen', 'risen']);
    expect(drawn.marks[0].map((cell) => cell?.mark)).not.toContain('risen');
    expect(drawn.points).toHaveLength(3);
    const [, , last] = drawn.points;
    expect(last.dispersion!.value).toBeGreaterThan(last.limits!.dispersion[1]);
    expect(last.divergence).toEqual({ value: 0.02, low: 0.01, high: 0.03 });
    expect(drawn.statement).toMatch(/rises over version a in c \(1 group\)/);
    expect(await open(named(), null, 'q1')).toMatchObject({ group: 'q1', goneGroup: false });
    expect(await open(named(), null, 'nope')).toMatchObject({ group: 'q2', goneGroup: true });
    expect(drawn.goneGroup).toBe(false);
    db.$client.close();
  });

  it('takes the reference that is asked for, that of the rule, and says when one is gone', async () => {
    const { db, lead, save, named, open } = device();
    for (const [i, firmware] of ['a', 'b', 'c'].entries()) save(firmware, null, i + 1);
    const id = named();
    const { versions } = await open(id);
    expect(versions.map(({ name }) => name)).toEqual(['a', 'b', 'c']);
    expect(await open(id, versions[1].id)).toMatchObject({ reference: 'b', goneReference: null });
    expect(await open(id, 'nothing')).toMatchObject({ reference: 'a', goneReference: 'that was asked for' });
    const rule = { deviceId: id, tolerance: 0.3, alpha: 0.01, updatedAt: 1, updatedBy: lead.personId };
    db.insert(gateRule)
      .values({ ...rule, referenceId: versions[2].id, referenceName: 'c' })
      .run();
    expect(await open(id)).toMatchObject({
      reference: 'c',
      tolerance: 0.3,
      alpha: 0.01,
      goneReference: null
    });
    // All datasets of the reference are put aside: the version stands, and has nothing to compare with.
    db.update(dataset).set({ deletedAt: 9 }).where(eq(dataset.firmware, 'c')).run();
    expect(await open(id)).toMatchObject({ reference: 'a', goneReference: 'c' });
    expect(await open(id, versions[2].id)).toMatchObject({ reference: 'a', goneReference: 'c' });
    db.update(gateRule).set({ referenceId: null }).run();
    expect(await open(id)).toMatchObject({ reference: 'a', goneReference: 'c' });
    db.$client.close();
  });

  it('says when versions stand in another order than their first datasets came', async () => {
    const { db, lead, save, named, open } = device();
    for (const [i, firmware] of ['a', 'b'].entries()) save(firmware, null, i + 1);
    const id = named();
    const { versions, outOfOrder } = await open(id);
    expect(outOfOrder).toBe(null);
    moveVersion(db, lead, id, { version: 1, versionId: versions[1].id, by: -1 });
    expect((await open(id)).outOfOrder).toEqual({ earlier: 'a', later: 'b' });
    db.$client.close();
  });

  it('is counted anew when a dataset is, though it keeps what it knows', async () => {
    const { db, save, named, open } = device();
    save('a', null, 1);
    save('b', null, 2);
    const id = named();
    const before = await open(id);
    expect(await open(id)).toEqual(before);
    save('b', null, 9, [0.03, 0.17]);
    expect((await open(id)).marks[0][1]?.mark).toBe('risen');
    expect(before.marks[0][1]?.mark).not.toBe('risen');
    db.$client.close();
  });

  it('is empty without versions, and not there for strangers', async () => {
    const { db, lead, stranger, named, open } = device();
    makeDataset(db, lead, { device: 'Kelp' });
    const id = named();
    expect(await open(id)).toMatchObject({
      versions: [],
      reference: null,
      group: null,
      points: [],
      marks: []
    });
    for (const actor of [stranger, { ...stranger, teamId: lead.teamId }])
      expect(await deviceTimeline(db, actor, id, { reference: null, group: null })).toEqual({
        ok: false,
        reason: 'unknown'
      });
    db.$client.close();
  });

  it('of 50 versions × 100 groups is drawn whole, the same at the second look', async () => {
    const { db, save, named, open } = device();
    const first = save('v0', 'g0', 1);
    const row = db.select().from(dataset).where(eq(dataset.id, first)).get()!;
    const many = Array.from({ length: 40 }, (_, i) => counts(i + 2));
    db.transaction((tx) => {
      for (let i = 1; i < 5000; i++)
        tx.insert(dataset)
          .values({
            ...row,
            id: newId(),
            firmware: `v${i % 50}`,
            group: `g${Math.floor(i / 50)}`,
            createdAt: i,
            counts: many[i % 40],
            digest: `sha256:${i}`
          })
          .run();
    });
    const id = named();
    const drawn = await open(id);
    expect([drawn.marks.length, drawn.marks[0].length, drawn.points.length]).toEqual([100, 50, 50]);
    expect(await open(id)).toEqual(drawn);
    db.$client.close();
  });
});

describe('versions pair by pair', () => {
  it('are tested with all pairs allowed for, the same every time, and only where two were chosen', async () => {
    const { db, lead, observer, save, named, open } = device();
    for (const [i, firmware] of ['a', 'b', 'c'].entries())
      save(firmware, 'q1', i + 1, firmware === 'c' ? [0.06, 0.14] : undefined);
    save('a', 'q2', 9);
    const id = named();
    const ids = (await open(id)).versions.map((version) => version.id);
    const pairs = async (versions: string[], group: string | null = 'q1') => {
      const read = await compareVersions(db, observer, id, { group, versions });
      if (!read.ok) throw new Error(read.reason);
      return read.pairs;
    };
    expect(await pairs([])).toMatchObject({ found: null, why: null, groups: ['q1', 'q2'], group: 'q1' });
    const { found } = await pairs(ids);
    expect(found!.tests.map(({ first, second }) => first + second)).toEqual(['ab', 'ac', 'bc']);
    expect(found!.tests.map(({ pAdjusted }) => pAdjusted <= found!.alpha)).toEqual([false, true, true]);
    expect(found!.because[0]).toMatch(/^2 of 3 pairs of versions differ/);
    expect(await pairs(ids)).toEqual({ ...(await pairs(ids)), found });
    // Of q2 one version alone was measured.
    expect(await pairs(ids, 'q2')).toMatchObject({
      found: null,
      why: expect.stringMatching(/two versions or more/)
    });
    expect(await pairs(['nothing', ids[0]])).toMatchObject({
      found: null,
      why: expect.stringMatching(/not here/)
    });
    expect(await pairs(ids, 'nope')).toMatchObject({
      found: null,
      group: 'q1',
      why: expect.stringMatching(/^There is no group of the name/)
    });
    for (let i = 0; i < 9; i++) save(`d${i}`, 'q1', 20 + i);
    named();
    const all = (await open(id)).versions.map((version) => version.id);
    expect(await pairs(all)).toMatchObject({ found: null, why: expect.stringMatching(/8 versions at most/) });
    expect(
      await compareVersions(db, { ...lead, teamId: 'other' }, id, { group: null, versions: all })
    ).toEqual({ ok: false, reason: 'unknown' });
    db.$client.close();
  });
});
