import { gStatistic } from '$lib/stats/versions/g-statistic';
import { describe, expect, it } from 'vitest';

describe('gStatistic', () => {
  it('agrees with SciPy', () => {
    // SciPy 1.17.1: chi2_contingency(table, correction=False, lambda_="log-likelihood")
    expect(gStatistic([1, 3, 7, 9, 3], [4, 6, 5, 2, 1])).toBeCloseTo(8.535128560042407, 12);
  });

  it('gives the worked example of severe reactions to a vaccine in thigh and arm', () => {
    // McDonald, Handbook of Biological Statistics, G-test of independence, after Jackson et al. 2013: 30 of 4788
    // and 76 of 8916, G = 2.14 (table from memory; SciPy 1.17.1 gives 2.1404612437656194 for it).
    expect(gStatistic([4758, 8840], [30, 76])).toBeCloseTo(2.14, 2);
    expect(gStatistic([4758, 8840], [30, 76])).toBeCloseTo(2.1404612437656194, 10);
  });

  it('is 0 for rows in proportion, and does not mind empty cells or which row comes first', () => {
    expect(gStatistic([2, 4, 6], [1, 2, 3])).toBeCloseTo(0, 12);
    expect(gStatistic([5, 0, 1, 0], [0, 3, 2, 0])).toBeCloseTo(gStatistic([0, 3, 2], [5, 0, 1]), 12);
  });
});
