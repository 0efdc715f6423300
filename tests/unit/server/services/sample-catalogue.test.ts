import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import { CATALOGUE, type CatalogueEntry } from '$lib/server/services/sample-catalogue';

/** Datasets in a file, where there are more than one. */
const DATASETS: Record<string, number> = { 'quench-sweep': 6, 'firmware-versions': 4 };

describe('the catalogue', () => {
  it.each(CATALOGUE.map((entry) => [entry.slug, entry] as const))(
    '%s can be read as it is',
    (slug, entry) => {
      const result = read(entry);
      expect(result.datasets.length).toBe(DATASETS[slug] ?? 1);
      for (const { suggested } of result.datasets) {
        // What the file itself states, in its remarks, must not contradict the catalogue.
        if (suggested.trials !== undefined) expect(suggested.trials).toBe(entry.trials);
        if (suggested.unit !== undefined) expect(suggested.unit).toBe(entry.unit);
      }
    }
  );

  it('keeps the order and the batches of a shot list', () => {
    const [{ data }] = read(entryOf('drifting-shots')).datasets;
    if (data.kind !== 'shots') throw new Error('not a shot list');
    expect(data.shots.length).toBe(3000);
    expect(new Set(data.batches).size).toBe(10);
    const [{ data: plain }] = read(entryOf('forty-shots')).datasets;
    expect(plain).toMatchObject({ kind: 'shots', batches: null });
  });

  it('reads "10+" as a lump', () => {
    const [{ data }] = read(entryOf('weldon-dice-lumped')).datasets;
    expect(data).toMatchObject({ kind: 'histogram', lump: { from: 10, shots: 18 } });
  });

  it('names the conditions of a sweep and of versions', () => {
    expect(
      read(entryOf('quench-sweep')).datasets.map(({ conditions }) => Object.values(conditions).at(-1))
    ).toEqual(['1', '2', '4', '8', '16', '32']);
    expect(
      read(entryOf('firmware-versions')).datasets.map(({ conditions }) => Object.values(conditions).at(-1))
    ).toEqual(['ebb 3.1', 'ebb 3.2', 'ebb 3.3', 'ebb 3.4']);
  });
});

function read(entry: CatalogueEntry) {
  const result = readCounts(readFileSync(`fixtures/${entry.file}`), { trials: entry.trials });
  if (!result.ok)
    throw new Error(result.problems.map(({ line, message }) => `${line}: ${message}`).join('\n'));
  return result;
}

function entryOf(slug: string): CatalogueEntry {
  const entry = CATALOGUE.find((candidate) => candidate.slug === slug);
  if (!entry) throw new Error(`${slug} is not in the catalogue`);
  return entry;
}
