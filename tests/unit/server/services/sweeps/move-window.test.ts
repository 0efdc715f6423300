import type { Database } from '$lib/server/db/client';
import { dataset } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { moveWindow } from '$lib/server/services/sweeps/move-window';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { asked, free, makeQuench, saved, setting, times } from '../../../../support/sweeps';

describe('a window that is moved', () => {
  const setOf = (db: Database, maker: Actor) => {
    const ids = makeQuench(db, maker, free, 1);
    const read = readSweep(db, maker, saved(db, maker, asked(ids)));
    if (!read.ok) throw new Error(read.reason);
    return { ids, kept: { document: read.document!, options: read.sweep.options } };
  };

  it('says what a sweep saved with it says, whatever became of the times of its datasets', () => {
    const { db, maker, observer } = setting();
    const { ids, kept } = setOf(db, maker);
    const window = { from: times[2], to: times[6] };
    const other = readSweep(db, maker, saved(db, maker, asked(ids, { window })));
    if (!other.ok) throw new Error(other.reason);
    db.update(dataset).set({ quenchTime: 77 }).where(eq(dataset.id, ids[0])).run();
    const moved = moveWindow(db, observer, kept, window);
    expect(moved).toEqual({ ok: true, document: other.document });
    expect(other.document!.laws!.common).not.toEqual(kept.document.laws!.common);
  });

  /** A document as the first ones were: without covariances. */
  const early = (kept: ReturnType<typeof setOf>['kept']) => ({
    ...kept,
    document: {
      ...kept.document,
      points: kept.document.points.map(({ covariance: _, ...point }) => point)
    }
  });

  it('says the same without the counts, and by the counts where no covariances were kept', () => {
    const { db, maker } = setting();
    const { kept } = setOf(db, maker);
    const window = { from: times[1], to: times[7] };
    const byCounts = moveWindow(db, maker, early(kept), window);
    expect(byCounts).toMatchObject({ ok: true });
    db.delete(dataset).run();
    expect(moveWindow(db, maker, kept, window)).toEqual(byCounts);
  });

  it('is refused where it holds too little; and by the counts, to strangers and when they are gone', () => {
    const { db, maker, stranger } = setting();
    const { ids, kept } = setOf(db, maker);
    const all = { from: 1, to: 100 };
    expect(moveWindow(db, maker, kept, { from: 1, to: 1.1 })).toMatchObject({
      ok: false,
      why: expect.stringMatching(/fewer than two different times/)
    });
    for (const actor of [stranger, { ...stranger, teamId: maker.teamId }])
      expect(moveWindow(db, actor, early(kept), all)).toMatchObject({ ok: false });
    db.delete(dataset).where(eq(dataset.id, ids[2])).run();
    expect(moveWindow(db, maker, early(kept), all)).toEqual({
      ok: false,
      why: 'The counts of “quench 3” are gone: the window cannot be moved.'
    });
  });
});

describe('a sweep of unlike conditions', () => {
  it('says that its datasets are of several devices and versions, in whatever window', () => {
    const { db, maker } = setting();
    const ids = makeQuench(db, maker, free, 1);
    const clear = readSweep(db, maker, saved(db, maker, asked(ids)));
    const more = { device: 'Another ring', firmware: '2.1' };
    db.update(dataset).set(more).where(eq(dataset.id, ids[2])).run();
    const read = readSweep(db, maker, saved(db, maker, asked(ids)));
    if (!read.ok || !clear.ok) throw new Error('gone');
    const said = /^The datasets are of 2 devices and 1 firmware version \(8 state none\): /;
    expect(clear.document!.cautions.join(' ')).not.toMatch(/The datasets are of/);
    expect(clear.document).not.toHaveProperty('mixed');
    expect(read.document!.cautions.filter((line) => said.test(line))).toHaveLength(1);
    const kept = { document: read.document!, options: read.sweep.options };
    const moved = moveWindow(db, maker, kept, { from: times[2], to: times[6] });
    if (!moved.ok) throw new Error(moved.why);
    expect(moved.document.cautions.filter((line) => said.test(line))).toHaveLength(1);
  });
});
