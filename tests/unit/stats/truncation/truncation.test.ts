import { lawWindow } from '$lib/stats/laws/law-window';
import { fitData } from '$lib/stats/fit/fit-data';
import { truncatedFit } from '$lib/stats/truncation/truncated-fit';
import { truncatedLaw } from '$lib/stats/truncation/truncated-law';
import { truncatedMoments } from '$lib/stats/truncation/truncated-moments';
import { describe, expect, it } from 'vitest';

const binomial = (trials: number, p: number) => ({ levels: [{ p, trials }], poissonPart: 0 });

describe('truncatedLaw', () => {
  it('is the published case: Bin(20, 0.1) cut at n ≤ 4 has variance/mean 0.7255', () => {
    const { mean, variance } = truncatedMoments(binomial(20, 0.1), { from: 0, to: 4 })!;
    expect((variance / mean).toFixed(4)).toBe('0.7255');
  });

  it('keeps the ratios of the law and sums to one', () => {
    const law = {
      levels: [
        { p: 0.7, trials: 3 },
        { p: 0.1, trials: 9 }
      ],
      poissonPart: 0
    };
    const whole = lawWindow(law);
    const { first, values } = truncatedLaw(law, { from: 2, to: 6 }, 1)!;
    expect([first, values.length]).toEqual([2, 5]);
    expect(values.reduce((sum, f) => sum + f, 0)).toBeCloseTo(1, 14);
    for (let i = 1; i < 5; i++) {
      const want = whole.values[2 + i - whole.first] / whole.values[2 - whole.first];
      expect(Math.abs(values[i] / values[0] / want - 1)).toBeLessThan(1e-13);
    }
    expect(truncatedLaw(law, { from: 13, to: Infinity })).toBeNull();
  });
});

describe('truncatedFit', () => {
  it('finds the law before the cut: exact shares of Bin(20, 0.1) at n ≤ 4', () => {
    const { first, values } = truncatedLaw(binomial(20, 0.1), { from: 0, to: 4 }, 1)!;
    const counts = Array.from(values, (f, i) => [first + i, f * 1e6] as [number, number]);
    const data = fitData({ kind: 'histogram', counts, lump: null }, 20);
    const { law, logLikelihood } = truncatedFit(data, { from: 0, to: 4 });
    // No law does better than the shares themselves.
    const best = values.reduce((sum, f) => sum + 1e6 * f * Math.log(f), 0);
    expect(best - logLikelihood).toBeGreaterThan(-1e-6);
    expect(best - logLikelihood).toBeLessThan(1e-3);
    const mean = law.levels.reduce((sum, { p, trials }) => sum + p * trials, 0);
    expect(mean).toBeCloseTo(2, 2);
  });

  it('does at least as well as the best equal trials, found on a fine grid', () => {
    const counts: [number, number][] = [
      [1, 40],
      [2, 66],
      [3, 51],
      [4, 20]
    ];
    const data = fitData({ kind: 'histogram', counts, lump: null }, 12);
    const kept = { from: 1, to: 4 };
    let grid = -Infinity;
    for (let p = 0.001; p < 1; p += 0.001) {
      const { first, values } = truncatedLaw(binomial(12, p), kept, 1)!;
      grid = Math.max(
        grid,
        counts.reduce((sum, [n, h]) => sum + h * Math.log(values[n - first]), 0)
      );
    }
    const { logLikelihood } = truncatedFit(data, kept);
    expect(logLikelihood).toBeGreaterThan(grid - 1e-6);
    expect(() => truncatedFit(data, { from: 2, to: 4 })).toThrow(RangeError);
    expect(() => truncatedFit({ ...data, trials: null }, kept)).toThrow(RangeError);
  });
});
