import { ringWindow } from '$lib/stats/misread/ring-window';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

describe('ringWindow', () => {
  it('agrees with counting every ring of an even number of kinks and every reading', () => {
    for (const [p, rate] of [
      [[0.1, 0.5, 0.03, 0.8, 0.2, 0.9, 0.05, 0.3], 0.07],
      [[0.05, 0.05, 0.05, 0.05, 0.05, 0.05, 0.05], 0.01],
      [[0.4, 0.1, 0.7], 0.2],
      [[0.2, 0.6, 0, 1], 0]
    ] as [number[], number][]) {
      const { first, values, scale } = ringWindow(
        p.map((one) => ({ p: one, trials: 1 })),
        rate
      );
      // The 2^16 terms of the reference are rounded at each addition: 1e-14 is its own error.
      everyReading(p, rate, true).forEach((want, n) =>
        expect(Math.abs((values[n - first] ?? 0) / scale - want), `n = ${n}`).toBeLessThan(1e-13)
      );
    }
  });

  it('gives nothing to odd counts and sums to one', () => {
    const { first, values, scale } = ringWindow([{ p: 0.08, trials: 101 }], 0.02);
    let sum = 0;
    values.forEach((value, i) => {
      if ((first + i) % 2 === 1) expect(value).toBe(0);
      sum += value / scale;
    });
    expect(Math.abs(sum - 1)).toBeLessThan(1e-13);
  });

  it('refuses what is no ring', () => {
    expect(() => ringWindow([{ p: 0.5, trials: 2 }], 0.1)).toThrow(RangeError);
    expect(() => ringWindow([{ p: 1, trials: 3 }], 0.1)).toThrow(RangeError);
  });
});
