import { bestLaw } from '$lib/stats/fit/best-law';
import { search } from '$lib/stats/fit/search';
import { workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf } from './plain';
import { refitCases } from './refits';

const thorough = { enough: 1e-9, worth: 1e-5, rounds: 200, transfers: Infinity };

describe('search', () => {
  it('reaches the best Landau–Zener law from equal trials and from a spread', () => {
    const { trials, observed } = refitCases.lz32;
    const data = dataOf({ shots: observed, trials });
    const best = bestLaw(data).logLikelihood;
    const mean = observed.reduce((sum, h, n) => sum + h * n, 0) / 5000;
    for (const start of [
      levelsOf([[mean / 32, 32]]),
      levelsOf([
        [0.5, 4],
        [0.02, 28]
      ])
    ]) {
      expect(search(workspace(data), start, thorough).value).toBeGreaterThan(best - 1e-3);
    }
  });

  it('ends at once where sums of 2^50 shots are rounded to a nat', () => {
    // Without a bar above the rounding, moves that "gain" noise would be made for all of the 200 rounds.
    const big = [2 ** 47, 2 ** 49, 2 ** 49, 2 ** 47].map((h) => h - 1);
    const { value } = search(workspace(dataOf({ shots: big, trials: 3 })), levelsOf([[0.5, 3]]), thorough);
    expect(Number.isFinite(value)).toBe(true);
  });

  it('does fewer rounds with less effort, and no worse than its start', () => {
    const { trials, observed } = refitCases.lz32;
    const data = dataOf({ shots: observed, trials });
    const start = levelsOf([[0.08, 32]]);
    const none = search(workspace(data), start, { ...thorough, rounds: 0 });
    const all = search(workspace(data), start, thorough);
    expect(all.value).toBeGreaterThan(none.value + 1);
  });
});
