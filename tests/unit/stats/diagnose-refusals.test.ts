import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { BadInput, type CountData, type DiagnoseOptions } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const quick: DiagnoseOptions = { ...defaultOptions, resamples: 39 };

function histogram(
  counts: [number, number][],
  lump: { from: number; shots: number } | null = null
): CountData {
  return { kind: 'histogram', counts, lump };
}

describe('diagnose', () => {
  it.each<[string, CountData, Partial<DiagnoseOptions>, RegExp]>([
    ['no shots', histogram([]), {}, /no shots/],
    ['a count above the trials', histogram([[13, 1]]), { trials: 12 }, /more than the 12 trials/],
    ['no trials', histogram([[0, 5]]), { trials: 0 }, /from 1 to/],
    [
      'a repeated count',
      histogram([
        [1, 5],
        [1, 6]
      ]),
      {},
      /stands twice/
    ],
    ['a lump alone', histogram([], { from: 5, shots: 30 }), { trials: 12 }, /nothing is left/],
    ['a fractional count', histogram([[1.5, 5]]), {}, /whole number/],
    ['NaN shots', histogram([[1, NaN]]), {}, /whole number/],
    ['odd counts as pairs', histogram([[3, 5]]), { unit: 'pair' }, /must be even/],
    [
      'shots beyond 2^53',
      histogram([
        [0, 2 ** 52],
        [1, 2 ** 52],
        [2, 2 ** 52]
      ]),
      {},
      /2\^53/
    ],
    [
      'counts from here to the moon',
      histogram([
        [0, 1],
        [1e8, 1]
      ]),
      {},
      /neighbouring counts/
    ],
    ['a supplied law of another length', histogram([[1, 5]]), { trials: 3, supplied: [0.1] }, /supplied/]
  ])('refuses %s in words', async (_name, data, options, reason) => {
    const refused = diagnose(data, { ...quick, ...options });
    await expect(refused).rejects.toBeInstanceOf(BadInput);
    await expect(refused).rejects.toThrow(reason);
  });
});
