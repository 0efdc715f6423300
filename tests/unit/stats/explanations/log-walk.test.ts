import { describe, expect, it } from 'vitest';
import { logWalk } from '$lib/stats/explanations/log-walk';
import { logBinomialPmf } from '$lib/stats/numerics/log-binomial-pmf';

const up = (trials: number, p: number) => (n: number) => ((trials - n) * p) / ((n + 1) * (1 - p));

describe('logWalk', () => {
  it('gives the same pmf wherever it starts, down to 1e-590', () => {
    for (const start of [0, 7, 60, 100]) {
      const window = logWalk(start, up(100, 1e-6), 100, 100);
      expect(window.first).toBe(0);
      for (let n = 0; n < window.values.length; n++) {
        const log = Math.log(window.values[n]) - Math.log(window.scale);
        expect(Math.abs(log - logBinomialPmf(n, 100, 1e-6))).toBeLessThan(1e-11 * (1 + Math.abs(log)));
      }
      expect(window.values.length).toBeGreaterThan(90);
    }
  });

  it('ends an endless law a part 1e-20 down, but not before the counts asked for', () => {
    const geometric = () => 0.5;
    expect(logWalk(0, geometric, Infinity, 3).values.length).toBeLessThan(70);
    expect(logWalk(0, geometric, Infinity, 300).values.length).toBeGreaterThanOrEqual(301);
  });
});
