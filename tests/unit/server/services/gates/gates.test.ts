import { dataset, event, gateResult } from '$lib/server/db/schema';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { readDevice } from '$lib/server/services/devices/read-device';
import { removeVersion } from '$lib/server/services/devices/remove-version';
import { findGate } from '$lib/server/services/gates/find-gate';
import { gatesAfterDiagnosis } from '$lib/server/services/gates/gates-after-diagnosis';
import { readGate } from '$lib/server/services/gates/read-gate';
import { setRule } from '$lib/server/services/gates/set-rule';
import { asc, eq, like } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { setting } from '../datasets/support';

/**
 * Expected histograms of 5000 shots of N = 20 trials, computed here: equal trials of p = 0.2, and the same mixed half
 * and half of p = 0.1 and 0.3, whose variance is N(p(1 − p) − 0.01) + N² 0.01 = 7 in place of 3.2.
 */
function histogram(ps: number[]): string {
  const counts: [number, number][] = [];
  for (let k = 0; k <= 20; k++) {
    const ways = Array.from({ length: k }, (_, i) => (20 - i) / (i + 1)).reduce((a, b) => a * b, 1);
    const share = ps.reduce((sum, p) => sum + (ways * p ** k * (1 - p) ** (20 - k)) / ps.length, 0);
    if (Math.round(5000 * share) > 0) counts.push([k, Math.round(5000 * share)]);
  }
  return JSON.stringify({ kind: 'histogram', counts, lump: null });
}
const EQUAL = histogram([0.2]);
const MIXED = histogram([0.1, 0.3]);

/** A device with two groups under three versions, of which the last has an excess in one group. */
function withGate() {
  const people = setting();
  const { db, lead } = people;
  const ids: Record<string, string> = {};
  for (const [at, firmware] of ['a', 'b', 'c'].entries())
    for (const group of ['q1', 'q2']) {
      const counts = firmware === 'c' && group === 'q2' ? MIXED : EQUAL;
      const facts = { counts, digest: `sha256:${counts.length}`, trials: 20, shots: 5000, mean: 4 };
      const id = makeDataset(db, lead, { ...facts, device: 'Kelp', firmware, group, createdAt: at });
      makeReport(db, lead, id, { verdict: counts === MIXED ? 'ruled-out' : 'compatible' });
      ids[firmware + group] = id;
    }
  nameKnownDevices(db);
  const [{ id: deviceId }] = listDevices(db, lead);
  const read = readDevice(db, lead, deviceId);
  if (!read.ok) throw new Error(read.reason);
  const [a, b, c] = read.device.versions.map(({ id }) => id);
  const rule = { version: 0, referenceId: a, tolerance: 0.1, alpha: 0.05, groups: null };
  const events = () =>
    db
      .select({ action: event.action, thing: event.thing })
      .from(event)
      .where(like(event.action, 'gate.%'))
      .orderBy(asc(event.id))
      .all()
      .filter(({ action }) => action !== 'gate.rule');
  const outcome = (versionId: string, now = 10) => {
    const gate = readGate(db, lead, deviceId, versionId, now);
    return gate.ok ? gate.report.outcome : gate.reason;
  };
  return { ...people, ids, deviceId, a, b, c, rule, events, outcome };
}

describe('the gate of a version', () => {
  it('fails the version with an excess, in that group, and passes the others; an event tells each once', () => {
    const { db, lead, deviceId, a, b, c, rule, events, outcome } = withGate();
    expect(outcome(b)).toBe('no-rule');
    expect(setRule(db, lead, deviceId, rule)).toEqual({ ok: true, version: 1 });
    expect([a, b, c].map((id) => outcome(id))).toEqual(['passed', 'passed', 'failed']);
    const gate = readGate(db, lead, deviceId, c, 99);
    if (!gate.ok) throw new Error(gate.reason);
    expect(gate.decidedAt, 'kept, not decided again').toBe(10);
    expect(gate.report.groups.map(({ group, outcome: of }) => [group, of])).toEqual([
      ['q1', 'passed'],
      ['q2', 'failed']
    ]);
    expect(events()).toEqual([
      { action: 'gate.pass', thing: a },
      { action: 'gate.pass', thing: b },
      { action: 'gate.fail', thing: c }
    ]);
    expect(db.select().from(gateResult).all()).toHaveLength(3);
    db.$client.close();
  });

  it('follows its datasets: put aside and brought back it is another outcome and the first again', () => {
    const { db, lead, ids, deviceId, c, rule, events, outcome } = withGate();
    setRule(db, lead, deviceId, rule);
    expect(outcome(c, 1)).toBe('failed');
    const aside = (at: number | null) =>
      db.update(dataset).set({ deletedAt: at }).where(eq(dataset.id, ids.cq2)).run();
    aside(5);
    expect(outcome(c, 2)).toBe('undecided');
    aside(null);
    expect(outcome(c, 3)).toBe('failed');
    expect(outcome(c, 4)).toBe('failed');
    expect(events().map(({ action }) => action)).toEqual(['gate.fail', 'gate.undecided', 'gate.fail']);
    db.$client.close();
  });

  it('is undecided while a diagnosis is missing or the reference is removed, and says so', () => {
    const { db, lead, ids, deviceId, a, b, rule } = withGate();
    setRule(db, lead, deviceId, rule);
    const late = makeDataset(db, lead, {
      device: 'Kelp',
      firmware: 'b',
      group: 'q3',
      createdAt: 9,
      trials: 20
    });
    const waits = readGate(db, lead, deviceId, b);
    expect(waits).toMatchObject({ ok: true, report: { outcome: 'undecided' } });
    expect(JSON.stringify(waits)).toContain('not-diagnosed');
    for (const id of [late, ids.aq1, ids.aq2])
      db.update(dataset).set({ firmware: null }).where(eq(dataset.id, id)).run();
    expect(removeVersion(db, lead, deviceId, a)).toMatchObject({ ok: true });
    const gone = readGate(db, lead, deviceId, b);
    expect(gone).toMatchObject({ ok: true, report: { outcome: 'undecided', rule: { reference: null } } });
    expect(JSON.stringify(gone)).toContain('no-reference');
    db.$client.close();
  });

  it('says that a newer dataset is not diagnosed, also where nobody asked and nothing waits', () => {
    const { db, lead, deviceId, b, c, rule, outcome } = withGate();
    setRule(db, lead, deviceId, rule);
    expect([outcome(b), outcome(c)]).toEqual(['passed', 'failed']);
    for (const firmware of ['b', 'c'])
      makeDataset(db, lead, { device: 'Kelp', firmware, group: 'q1', createdAt: 9, trials: 20 });
    const [passing, failing] = [b, c].map((id) => readGate(db, lead, deviceId, id));
    if (!passing.ok || !failing.ok) throw new Error('no gate');
    // One group failed already: what the other comes to cannot change that.
    expect([passing.report.outcome, failing.report.outcome]).toEqual(['undecided', 'failed']);
    for (const { report, waiting } of [passing, failing]) {
      expect(waiting).toEqual([]);
      expect(report.groups[0].reasons.join(' ')).toMatch(/is not diagnosed yet: .* nobody has asked for one/);
    }
    db.$client.close();
  });

  it('is decided a moment after a report of the reference comes, for every version', async () => {
    const { db, lead, ids, deviceId, a, b, c, rule, events } = withGate();
    setRule(db, lead, deviceId, rule);
    const told = gatesAfterDiagnosis(db, 1);
    told(ids.aq1);
    told(ids.aq2);
    for (let i = 0; i < 200 && events().length < 3; i++) await new Promise((go) => setTimeout(go, 10));
    expect(events().map(({ thing }) => thing)).toEqual([a, b, c]);
    db.$client.close();
  });

  it('has a rule that leads and experimenters set, each knowing what stands', () => {
    const { db, lead, experimenter, observer, stranger, deviceId, b, c, rule, outcome } = withGate();
    for (const actor of [observer, stranger, { ...stranger, teamId: lead.teamId }])
      expect(setRule(db, actor, deviceId, rule)).toEqual({ ok: false, reason: 'unknown' });
    expect(setRule(db, lead, deviceId, { ...rule, referenceId: 'x' })).toMatchObject({
      reason: 'no-version'
    });
    expect(setRule(db, experimenter, deviceId, rule)).toMatchObject({ ok: true });
    expect(setRule(db, lead, deviceId, rule)).toEqual({ ok: false, reason: 'stale' });
    expect(setRule(db, lead, deviceId, { ...rule, version: 1, groups: ['q1'] })).toMatchObject({
      version: 2
    });
    expect(outcome(c)).toBe('passed');
    const nowhere = { ...rule, version: 2, groups: ['q1', 'q99'] };
    expect(setRule(db, lead, deviceId, nowhere)).toEqual({ ok: false, reason: 'no-group', groups: ['q99'] });
    expect(outcome(c), 'by the rule that stands').toBe('passed');
    for (const actor of [stranger, { ...stranger, teamId: lead.teamId }]) {
      expect(readGate(db, actor, deviceId, b)).toEqual({ ok: false, reason: 'unknown' });
      expect(findGate(db, actor, { device: 'Kelp', version: 'b' })).toMatchObject({ reason: 'no-device' });
    }
    expect(readGate(db, observer, deviceId, b)).toMatchObject({ ok: true });
    expect(findGate(db, observer, { device: deviceId, version: 'b' })).toMatchObject({ version: { id: b } });
    expect(findGate(db, observer, { device: 'Kelp', version: 'z' })).toMatchObject({ reason: 'no-version' });
    db.$client.close();
  });
});
