import type { Database } from '$lib/server/db/client';
import { dataset, event, sweep } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { listSweeps } from '$lib/server/services/sweeps/list-sweeps';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { restoreSweep } from '$lib/server/services/sweeps/restore-sweep';
import { saveSweep } from '$lib/server/services/sweeps/save-sweep';
import { ratioTitle } from '$lib/charts/ratio-title';
import { sweepTitle } from '$lib/charts/sweep-titles';
import { chiSquareTail } from '$lib/stats/numerics/chi-square-tail';
import { eq, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { makeDataset, makeReport } from '../../../../support/datasets';
import { asked, free, makeQuench, saved, setting, times } from '../../../../support/sweeps';
import { lostInPairs } from '../../../stats/sweep/simulated';

describe('a saved sweep of a Landau–Zener quench over two decades, 5000 shots each', () => {
  it('has ½ and 0.293 inside its intervals and one exponent for all', () => {
    const { db, maker, observer } = setting();
    const ids = makeQuench(db, maker, free, 1);
    makeReport(db, maker, ids[3], { verdict: 'compatible' });
    const dispersion = { value: 1.2, low: 1.1, high: null };
    makeReport(db, maker, ids[3], {
      verdict: 'ruled-out',
      number: 2,
      document: JSON.stringify({ moments: { dispersion } })
    });
    const read = readSweep(db, observer, saved(db, maker, asked(ids)));
    if (!read.ok) throw new Error(read.reason);
    const document = read.document!;
    expect(read.sweep).toMatchObject({ name: 'Quench times 1 to 100 µs', by: 'Ada Invented' });
    expect(document.laws!.common.p).toBeGreaterThan(0.05);
    expect(document.expected).toMatchObject({ exponent: 0.5, inside: true });
    const { p, z } = document.laws!.common;
    // P(|z| at least this large) is the tail of χ² with one degree of freedom at z².
    expect(chiSquareTail(z! * z!, 1)).toBeCloseTo(p, 9);
    const ratio = document.steady.find(({ id }) => id === 'variance-over-mean')!;
    expect(ratio.steady.low).toBeLessThan(1 - Math.SQRT1_2);
    expect(ratio.steady.high).toBeGreaterThan(1 - Math.SQRT1_2);
    expect(document.points[3].dataset).toMatchObject({ id: ids[3], verdict: 'ruled-out', dispersion });
    expect(document.points[4].dataset).toMatchObject({ verdict: null, dispersion: null });
    expect(document.timeUnit).toBe('µs');
  });

  it('with loss in pairs at the slow end refuses one exponent, and names no physics', () => {
    const { db, maker } = setting();
    const lossy = times.map((a, i) => lostInPairs(free[i], a / 2000));
    const read = readSweep(db, maker, saved(db, maker, asked(makeQuench(db, maker, lossy, 3))));
    if (!read.ok) throw new Error(read.reason);
    expect(read.document!.laws!.common.p).toBeLessThan(0.05);
    expect(read.document!.statement).toMatch(/refused|No power laws hold/);
    const { statement, because, steady } = read.document!;
    const titles = [sweepTitle(read.document!), ...steady.map((one) => ratioTitle(one, { alpha: 0.05 }))];
    for (const line of [statement, ...because, ...titles])
      expect(line).not.toMatch(/loss|lost|annihilat|coarsen|Kibble|crosstalk|\bpairs?\b/i);
    expect([statement, ...because].join(' ')).not.toMatch(/Landau|Zener/);
    expect(read.document!.cautions.join(' ')).toMatch(/do not say which/);
  });

  it('keeps N, and says whose misreads are not taken out', () => {
    const { db, maker } = setting();
    const ids = makeQuench(db, maker, free, 1);
    const clear = readSweep(db, maker, saved(db, maker, asked(ids)));
    db.update(dataset).set({ misread: 0.01 }).where(eq(dataset.id, ids[2])).run();
    const read = readSweep(db, maker, saved(db, maker, asked(ids)));
    if (!read.ok || !clear.ok) throw new Error('gone');
    expect(read.document!.points.map(({ trials }) => trials)).toEqual(ids.map(() => 512));
    expect(read.document!.cautions.at(-1)).toMatch(
      /^Misreads are stated for “quench 3”, and are not taken out/
    );
    expect(clear.document!.cautions.join(' ')).not.toMatch(/Misreads are stated/);
  });

  it('converts units that are known, and stays as it was when its datasets change', () => {
    const { db, maker } = setting();
    const ids = makeQuench(db, maker, free, 1);
    const before = saved(db, maker, asked(ids));
    db.update(dataset)
      .set({ quenchTime: times[8] / 1000, quenchUnit: 'ms' })
      .where(eq(dataset.id, ids[8]))
      .run();
    const after = saved(db, maker, asked(ids));
    const [a, b] = [before, after].map((id) => readSweep(db, maker, id));
    if (!a.ok || !b.ok) throw new Error('gone');
    expect(b.document!.points[8].time).toBeCloseTo(a.document!.points[8].time, 9);
    expect(() => db.update(sweep).set({ document: '{}' }).where(eq(sweep.id, before)).run()).toThrow();
  });
});

describe('what makes no sweep is refused in words, and nothing is kept', () => {
  /** All nine, the fifth of them another dataset. */
  const swapped = (ids: string[], db: Database, actor: Actor, more: Partial<typeof dataset.$inferInsert>) =>
    ids.with(
      4,
      makeDataset(db, actor, {
        name: 'the other',
        counts: '{"kind":"histogram","counts":[[0,9],[2,1]],"lump":null}',
        unit: 'pair',
        geometry: 'ring-bonds',
        quenchTime: 10,
        quenchUnit: 'µs',
        ...more
      })
    );
  const counts = (list: string, lump: string) =>
    ({ counts: `{"kind":"histogram","counts":${list},"lump":${lump}}` }) as const;
  const others: [string, RegExp, Partial<typeof dataset.$inferInsert>][] = [
    ['a time of zero', /“the other” has a time of 0: .* above 0/, { quenchTime: 0 }],
    ['no time', /“the other” states no quench time/, { quenchTime: null }],
    ['units nobody knows', /Units are mixed: .*“ħ\/J”/, { quenchUnit: 'ħ/J' }],
    ['defects beside pairs', /“the other” in defects: choose/, { unit: 'defect' }],
    ['odd counts as pairs', /must be even/, counts('[[0,9],[1,1]]', 'null')],
    [
      'another geometry',
      /“quench 1” counts kinks round a ring and “the other” excited sites/,
      { geometry: 'sites' }
    ],
    [
      'another N',
      /“quench 1” has N = 512 and “the other” N = 420: every cumulant grows with N/,
      { trials: 420 }
    ],
    ['a lump', /“the other” lumps counts/, counts('[[0,9],[2,1]]', '{"from":4,"shots":1}')],
    ['a cut', /Of “the other” only the counts 2- were kept/, { kept: '2-' }]
  ];

  it.each(others)('%s', (_, why, more) => {
    const { db, maker } = setting();
    expectRefused(db, maker, swapped(makeQuench(db, maker, free, 1), db, maker, more), why);
  });

  it('one dataset, and the same twice', () => {
    const { db, maker } = setting();
    const [id] = makeQuench(db, maker, free, 1);
    expectRefused(db, maker, [id], /at least two datasets/);
    expectRefused(db, maker, [id, id], /at least two datasets/);
  });

  function expectRefused(db: Database, maker: Actor, ids: string[], why: RegExp): void {
    expect(saveSweep(db, maker, asked(ids))).toEqual({
      ok: false,
      reason: 'refused',
      why: expect.stringMatching(why)
    });
    expect(db.select().from(sweep).all()).toEqual([]);
    expect(db.select().from(event).all()).toEqual([]);
  }
});

describe('sweeps are', () => {
  it('made by who may diagnose, of datasets of their own team that are not put aside', () => {
    const { db, people, observer, stranger, lead } = setting();
    const ids = makeQuench(db, lead, free, 1);
    const unknown = { ok: false, reason: 'unknown' };
    for (const actor of people) expect(saveSweep(db, actor, asked(ids)).ok).toBe(actor.role !== 'observer');
    expect(saveSweep(db, observer, asked(ids))).toEqual(unknown);
    expect(saveSweep(db, stranger, asked(ids))).toEqual(unknown);
    expect(saveSweep(db, { ...stranger, teamId: lead.teamId }, asked(ids))).toEqual(unknown);
    db.update(dataset).set({ deletedAt: 3 }).where(eq(dataset.id, ids[0])).run();
    expect(saveSweep(db, lead, asked(ids))).toEqual(unknown);
  });

  it('read and listed in their team alone', () => {
    const { db, people, stranger, lead } = setting();
    const id = saved(db, lead, asked(makeQuench(db, lead, free, 1), { name: 'Ours' }));
    for (const actor of people) {
      expect(readSweep(db, actor, id).ok).toBe(true);
      expect(listSweeps(db, actor, 1)).toMatchObject({ total: 1, rows: [{ name: 'Ours', datasets: 9 }] });
    }
    for (const actor of [stranger, { ...stranger, teamId: lead.teamId }]) {
      expect(readSweep(db, actor, id)).toEqual({ ok: false, reason: 'unknown' });
      expect(listSweeps(db, actor, 1).rows).toEqual([]);
    }
    expect(listSweeps(db, lead, 99).page).toBe(1);
  });

  it('put aside and brought back by leads, and by experimenters where they are their own', () => {
    const { db, lead, maker, other, observer, stranger } = setting();
    const id = saved(db, maker, asked(makeQuench(db, maker, free, 1), { name: 'Mine' }));
    const unknown = { ok: false, reason: 'unknown' };
    for (const actor of [other, observer, stranger]) expect(putSweepAside(db, actor, id)).toEqual(unknown);
    for (const actor of [maker, lead]) {
      expect(putSweepAside(db, actor, id, 7)).toEqual({ ok: true, name: 'Mine' });
      expect(putSweepAside(db, actor, id)).toEqual(unknown);
      expect(readSweep(db, actor, id).ok).toBe(false);
      expect(listSweeps(db, actor, 1).total).toBe(0);
      for (const no of [other, observer, stranger]) expect(restoreSweep(db, no, id)).toEqual(unknown);
      expect(restoreSweep(db, actor, id)).toEqual({ ok: true, name: 'Mine' });
    }
    const told = db.select({ action: event.action }).from(event).all();
    expect(told.map(({ action }) => action)).toEqual([
      'sweep.make',
      'sweep.aside',
      'sweep.restore',
      'sweep.aside',
      'sweep.restore'
    ]);
  });

  it('listed by an index', () => {
    const { db, lead } = setting();
    const plan = db.all<{ detail: string }>(
      sql`explain query plan select id from sweep where team_id = ${lead.teamId} and deleted_at is null order by created_at desc, rowid desc limit 25`
    );
    expect(plan.map(({ detail }) => detail).join('\n')).toMatch(/USING (COVERING )?INDEX sweep_by_team/);
    expect(plan.map(({ detail }) => detail).join('\n')).not.toMatch(/TEMP B-TREE/);
  });
});
