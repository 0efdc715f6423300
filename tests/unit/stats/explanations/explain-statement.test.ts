import { describe, expect, it } from 'vitest';
import { explainStatement } from '$lib/stats/explanations/explain-statement';
import { sayFit } from '$lib/model/report/say-fit';
import { formatNumber } from '$lib/stats/words/format-number';
import type { Explanation } from '$lib/stats/explanations/types';

const story = (p: number | null, behind = 0): Explanation => ({
  id: behind === 0 ? 'common-cause' : 'bursts',
  logLikelihood: -100 - behind / 2,
  parameters: 2,
  aic: 204 + behind,
  behind,
  weight: behind === 0 ? 0.9999 : 0.0001,
  base: 0.1,
  parameter: { symbol: 'ρ', value: 0.02, low: 0.01, high: 0.03, atBound: null },
  second: null,
  gSquared: 12,
  goodness: p === null ? null : { p, smallestP: 1 / 200, resamples: 199 },
  meaning: 'Something.'
});

describe('what is said of the leading story and its fit', () => {
  // Every p that 199 resamples can show: k/200.
  const shown = Array.from({ length: 200 }, (_, k) => (k + 1) / 200);

  it.each([0.01, 0.05, 0.001])('has one threshold, which the printed digits keep: level %f', (alpha) => {
    for (const p of shown) {
      const said = explainStatement([story(p), story(p, 30)], ['common-cause'], alpha);
      const printed = Number(formatNumber(p, 2));
      const unfit = printed <= Math.max(alpha, 0.005);
      expect(said.includes('it does not fit'), `${p}`).toBe(unfit);
      expect(said.includes('is not rejected'), `${p}`).toBe(!unfit);
      expect(sayFit(story(p), alpha)).toBe(unfit ? 'best of these, and does not fit' : '');
      expect(sayFit(story(p, 30), alpha)).toBe(unfit ? 'does not fit' : '');
    }
  });

  it('gives a weight to a story that does not fit only as one among the list', () => {
    const said = explainStatement([story(0.005), story(0.3, 30)], ['common-cause'], 0.01);
    expect(said).not.toMatch(/described best/);
    expect(said).toMatch(/a common cause comes nearest to the counts, but it does not fit/);
    expect(said).toMatch(/sets it against the others alone/);
  });

  it('says nothing against a fit that was not asked', () => {
    expect(sayFit(story(null), 0.01)).toBe('');
    expect(explainStatement([story(null)], ['common-cause'], 0.01)).not.toMatch(/fit\b.*(reject|does not)/);
  });
});
