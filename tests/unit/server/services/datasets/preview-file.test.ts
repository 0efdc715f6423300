import type { ReadingChoices } from '$lib/model/team/datasets/reading-choices';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { previewFile } from '$lib/server/services/datasets/preview-file';
import { saveDatasets } from '$lib/server/services/datasets/save-datasets';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { LONG_TABLE, setting, store, wholeFile } from './support';

function previewOf(db: Database, actor: Actor, id: string, choices: ReadingChoices = {}) {
  const read = previewFile(db, actor, id, choices);
  if (!read.ok) throw new Error(read.reason);
  return read.preview;
}

describe('previewFile', () => {
  it('makes one dataset of each combination, with the conditions of its columns', () => {
    const { db, lead } = setting();
    const preview = previewOf(db, lead, store(db, lead, LONG_TABLE));
    expect(preview.problems).toEqual([]);
    expect(preview.datasets).toHaveLength(4);
    expect(preview.datasets[3].conditions).toMatchObject({
      // The column of notes is the same on all of them.
      name: 'device Marram, firmware ebb 3.2, quench_time_us 5, date 2026-03-11',
      device: 'Marram',
      firmware: 'ebb 3.2',
      quenchTime: 5,
      quenchUnit: 'µs',
      measuredOn: '2026-03-11',
      // A column of remarks tells no datasets apart and is still kept.
      notes: 'invented'
    });
    // 93 + 63 + 33 shots; (63 + 2 · 33) / 189.
    expect(preview.datasets[3]).toMatchObject({ shots: 189, smallest: 0, largest: 2, open: false });
    expect(preview.datasets[3].mean).toBeCloseTo(129 / 189, 12);
    db.$client.close();
  });

  it('tells every problem with its line, and obeys choices', () => {
    const { db, lead } = setting();
    const bad = previewOf(db, lead, store(db, lead, 'count,shots\n0,5\n1,-2\n2,x\n'));
    expect(bad.datasets).toEqual([]);
    expect(bad.problems.map(({ line }) => line)).toEqual([3, 4]);
    const plain = store(db, lead, '3\n1\n2\n', 'three.txt');
    expect(previewOf(db, lead, plain).datasets[0]).toMatchObject({ kind: 'shots', shots: 3 });
    const chosen = previewOf(db, lead, plain, { format: 'positions' });
    expect(chosen.datasets[0]).toMatchObject({ kind: 'histogram', shots: 6 });
    expect(chosen.datasets[0].conditions.name).toBe('three');
    db.$client.close();
  });

  it('says which datasets are there from the same bytes, and which have equal counts', () => {
    const { db, lead } = setting();
    const file = store(db, lead, '0,5\n1,2\n');
    const saved = saveDatasets(db, lead, wholeFile(db, lead, file));
    if (!saved.ok) throw new Error(saved.reason);
    expect(previewOf(db, lead, file).datasets[0]).toMatchObject({ already: saved.saved, sameCounts: [] });
    const other = store(db, lead, 'count,shots\n0,5\n1,2\n');
    expect(previewOf(db, lead, other).datasets[0]).toMatchObject({ already: [], sameCounts: saved.saved });
    db.$client.close();
  });

  it('refuses counts too far apart to be diagnosed, in words', () => {
    const { db, lead } = setting();
    const preview = previewOf(db, lead, store(db, lead, 'count,shots\n0,5\n90000,2\n'));
    expect(preview.datasets).toEqual([]);
    expect(preview.problems[0].message).toMatch(/reach from 0 to 90\u202f000/);
    db.$client.close();
  });

  it('does not know files of another team, nor reads for an observer', () => {
    const { db, lead, observer, stranger } = setting();
    const file = store(db, lead, readFileSync('fixtures/weldon-dice.csv', 'utf8'));
    for (const actor of [observer, stranger])
      expect(previewFile(db, actor, file, {})).toEqual({ ok: false, reason: 'unknown' });
    db.$client.close();
  });
});
