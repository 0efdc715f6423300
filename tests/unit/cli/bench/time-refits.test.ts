import { describe, expect, it } from 'vitest';
import { bestLaw } from '$lib/stats/fit/best-law';
import { refit } from '$lib/stats/fit/refit';
import { readRefitCase } from '../../../../src/cli/bench/refit-case';

/** The best log-likelihoods were found elsewhere, from many starts; see fixtures/bench. */
describe.each(['weldon12', 'lz32'] as const)('the refits of %s', (id) => {
  const { observed, resampled } = readRefitCase(id);
  const { levels } = bestLaw(observed);

  it('are of 199 histograms with as many shots as the one observed', () => {
    expect(resampled!.length).toBe(199);
    for (const { data } of resampled!) expect(data.total).toBe(observed.total);
  });

  it('all come within 1e-3 nats of the best known', () => {
    const short = resampled!.map(({ data, best }) => best - refit(data, levels).logLikelihood);
    expect(Math.max(...short)).toBeLessThan(1e-3);
    // Nor better by more than the digits of the list: that would be another likelihood.
    expect(Math.min(...short)).toBeGreaterThan(-1e-3);
  });
});
