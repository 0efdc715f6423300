import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { type CountData, type DiagnoseOptions, type Diagnosis } from '$lib/stats/types';
import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const quick: DiagnoseOptions = { ...defaultOptions, resamples: 39 };

function histogram(
  counts: [number, number][],
  lump: { from: number; shots: number } | null = null
): CountData {
  return { kind: 'histogram', counts, lump };
}

/** Every number in a document is finite: JSON would turn others into null without a word. */
function unfinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [`${path} = ${value}`];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => unfinite(inner, `${path}.${key}`));
}

function hold(found: Diagnosis): void {
  expect(unfinite(found)).toEqual([]);
  for (const test of found.tests) {
    expect(test.p).toBeGreaterThan(0);
    expect(test.p).toBeLessThanOrEqual(1);
    expect(test.pAdjusted).toBeGreaterThanOrEqual(test.p);
  }
  for (const interval of Object.values(found.moments)) {
    if (interval === null || typeof interval === 'number' || interval.value === null) continue;
    if (interval.low !== null) expect(interval.low).toBeLessThanOrEqual(interval.value);
    if (interval.high !== null) expect(interval.high).toBeGreaterThanOrEqual(interval.value);
  }
  expect(found.fit.floor).toBeLessThanOrEqual(found.fit.divergence);
  expect(found.distribution.reduce((sum, row) => sum + row.shots, 0)).toBe(found.data.shots);
}

describe('diagnose', () => {
  it('gives the same bytes for the same data, options and seed, and other p-values for another seed', async () => {
    const data = histogram([
      [0, 30],
      [1, 70],
      [2, 60],
      [3, 20],
      [4, 5]
    ]);
    const once = JSON.stringify(await diagnose(data, { ...quick, trials: 12 }));
    expect(JSON.stringify(await diagnose(data, { ...quick, trials: 12 }))).toBe(once);
    expect(JSON.stringify(await diagnose(data, { ...quick, trials: 12, seed: 2 }))).not.toBe(once);
  });

  it('holds for any small histogram, N known or not', async () => {
    const rows = fc.uniqueArray(fc.tuple(fc.nat(24), fc.integer({ min: 1, max: 400 })), {
      selector: ([count]) => count,
      minLength: 1,
      maxLength: 8
    });
    await fc.assert(
      fc.asyncProperty(rows, fc.option(fc.integer({ min: 24, max: 60 })), async (counts, trials) => {
        hold(await diagnose(histogram(counts), { ...quick, resamples: 19, trials }));
      }),
      { numRuns: 60, seed: 5 }
    );
  }, 120_000);

  it.each<[string, CountData, Partial<DiagnoseOptions>]>([
    ['one shot', histogram([[3, 1]]), { trials: 10 }],
    ['one shot, N unknown', histogram([[3, 1]]), {}],
    ['all at one count', histogram([[3, 500]]), { trials: 12 }],
    ['nothing but empty shots', histogram([[0, 500]]), {}],
    ['every trial a defect', histogram([[2, 500]]), { trials: 2 }],
    [
      'one trial',
      histogram([
        [0, 300],
        [1, 120]
      ]),
      { trials: 1 }
    ],
    [
      '2^40 shots',
      histogram([
        [0, 2 ** 38],
        [1, 2 ** 39],
        [2, 2 ** 38]
      ]),
      { trials: 5 }
    ],
    [
      '2^52 shots',
      histogram([
        [0, 2 ** 50],
        [1, 2 ** 51],
        [2, 2 ** 50]
      ]),
      {}
    ],
    [
      'a million trials',
      histogram([
        [40, 10],
        [50, 30],
        [60, 12]
      ]),
      { trials: 1e6 }
    ],
    [
      'two counts far apart',
      histogram([
        [0, 500],
        [40, 500]
      ]),
      { trials: 64 }
    ],
    [
      'counts near N',
      histogram([
        [62, 10],
        [63, 80],
        [64, 40]
      ]),
      { trials: 64 }
    ],
    [
      'counts that underflow',
      histogram([
        [0, 50],
        [2500, 50]
      ]),
      {}
    ],
    ['a lump beside a row', histogram([[0, 40]], { from: 1, shots: 30 }), {}],
    [
      'pairs',
      histogram([
        [0, 40],
        [2, 50],
        [4, 9]
      ]),
      { trials: 20, unit: 'pair' }
    ],
    [
      'a shot list',
      { kind: 'shots', shots: [1, 2, 0, 3, 1, 1, 2, 0, 4, 2], batches: [...'aabbccddee'] },
      { trials: 9 }
    ]
  ])('gives a finite document for %s', async (_name, data, options) => {
    hold(await diagnose(data, { ...quick, ...options }));
  });

  it('can be cancelled, and tells how far it is', async () => {
    const controller = new AbortController();
    const shares: number[] = [];
    const running = diagnose(
      histogram([
        [0, 300],
        [1, 900],
        [2, 1000],
        [3, 700],
        [4, 200]
      ]),
      { ...defaultOptions, resamples: 100_000, trials: 40 },
      ({ share }) => {
        shares.push(share);
        if (shares.length === 6) controller.abort(new Error('cancelled'));
      },
      controller.signal
    );
    await expect(running).rejects.toThrow('cancelled');
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
  });

  it('40 ordinary shots are undecided, with the number that would decide', async () => {
    const expected = [6, 11, 11, 7, 3, 2];
    const found = await diagnose(histogram(expected.map((h, n) => [n, h])), {
      ...defaultOptions,
      trials: 20
    });
    expect(found.answer.verdict).toBe('undecided');
    expect(found.answer.shotsToDecide).toBeGreaterThan(400);
    expect(found.answer.statement).toContain('would decide');
  });
});
