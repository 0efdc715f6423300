import { lawWindow } from '$lib/stats/laws/law-window';
import { fitData } from '$lib/stats/fit/fit-data';
import { readLevels } from '$lib/stats/misread/read-chain';
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
    const { chain, value: logLikelihood } = truncatedFit(data, { from: 0, to: 4 });
    // No law does better than the shares themselves.
    const best = values.reduce((sum, f) => sum + 1e6 * f * Math.log(f), 0);
    expect(best - logLikelihood).toBeGreaterThan(-1e-6);
    expect(best - logLikelihood).toBeLessThan(1e-3);
    const mean = readLevels(chain).reduce((sum, { p, trials }) => sum + p * trials, 0);
    expect(mean).toBeCloseTo(2, 2);
  });

  // Modes 0.9·exp(−1.2 k²), k = (2j − 1)π/20: more levels than a chain of three can follow.
  const modes = Array.from({ length: 10 }, (_, j) => ({
    p: 0.9 * Math.exp(-1.2 * (((2 * j + 1) * Math.PI) / 20) ** 2),
    trials: 1
  }));

  it.each([
    { from: 0, to: 4 },
    { from: 1, to: 4 },
    { from: 2, to: Infinity }
  ])('comes near uneven modes through any cut: %j', (kept) => {
    const { first, values } = truncatedLaw({ levels: modes, poissonPart: 0 }, kept, 1)!;
    const counts = Array.from(values, (f, i) => [first + i, f * 1e5] as [number, number]);
    const { value } = truncatedFit(fitData({ kind: 'histogram', counts, lump: null }, 10), kept);
    const best = values.reduce((sum, f) => sum + 1e5 * f * Math.log(f), 0);
    // Of 100 000 shots; half a nat is what one more number gains by chance.
    expect(best - value).toBeLessThan(0.5);
  });

  it('finds uneven modes of which only the empty shots were dropped, however many levels they have', () => {
    const kept = { from: 1, to: Infinity };
    const { first, values } = truncatedLaw({ levels: modes, poissonPart: 0 }, kept, 1)!;
    const counts = Array.from(values, (f, i) => [first + i, f * 1e6] as [number, number]);
    const data = fitData({ kind: 'histogram', counts, lump: null }, 10);
    const { chain, value } = truncatedFit(data, kept);
    const best = values.reduce((sum, f) => sum + 1e6 * f * Math.log(f), 0);
    expect(best - value).toBeLessThan(0.01);
    // A pmf of its own, by adding trials one by one.
    let pmf = [1];
    for (const { p, trials } of readLevels(chain))
      for (let i = 0; i < trials; i++)
        pmf = [...pmf, 0].map((f, n) => f * (1 - p) + (n > 0 ? pmf[n - 1] * p : 0));
    expect(pmf).toHaveLength(11);
    values.forEach((f, i) => expect(Math.abs(pmf[first + i] / (1 - pmf[0]) - f)).toBeLessThan(2e-5));
  });

  it('knows the best equal trials beside it', () => {
    const counts: [number, number][] = [
      [1, 40],
      [2, 66],
      [3, 51],
      [4, 20]
    ];
    const kept = { from: 1, to: Infinity };
    const { even } = truncatedFit(fitData({ kind: 'histogram', counts, lump: null }, 12), kept);
    let grid = -Infinity;
    for (let p = 0.0005; p < 1; p += 0.0005) {
      const { first, values } = truncatedLaw(binomial(12, p), kept, 1)!;
      grid = Math.max(
        grid,
        counts.reduce((sum, [n, h]) => sum + h * Math.log(values[n - first]), 0)
      );
    }
    expect(even.value).toBeGreaterThanOrEqual(grid);
    expect(even.value - grid).toBeLessThan(2e-3);
    expect(even.chain.runs).toEqual([{ level: 0, trials: 12 }]);
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
    const { value: logLikelihood } = truncatedFit(data, kept);
    expect(logLikelihood).toBeGreaterThan(grid - 1e-6);
    expect(() => truncatedFit(data, { from: 2, to: 4 })).toThrow(RangeError);
    expect(() => truncatedFit({ ...data, trials: null }, kept)).toThrow(RangeError);
  });
});
