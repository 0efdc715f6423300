import { chainMoments } from '$lib/stats/misread/chain-moments';
import { chainWindow } from '$lib/stats/misread/chain-window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { everyReading, momentsOf } from './every-reading';

const probability = fc.double({ min: 0, max: 1, noNaN: true });

describe('chainMoments', () => {
  it('agrees with counting every chain and every reading to 1e-12, N ≤ 8', () => {
    const p = [0.1, 0.5, 0.03, 0.8, 0.2, 0.9, 0.05, 0.3];
    for (let bonds = 1; bonds <= 8; bonds++) {
      for (const rate of [0, 0.01, 0.2, 0.5]) {
        const some = p.slice(0, bonds);
        const want = momentsOf(everyReading(some, rate));
        const { mean, variance } = chainMoments(
          some.map((one) => ({ p: one, trials: 1 })),
          rate
        );
        expect(Math.abs(mean - want.mean)).toBeLessThan(1e-12);
        expect(Math.abs(variance - want.variance)).toBeLessThan(1e-12);
      }
    }
  });

  it('agrees with the law itself along long chains of blocks', () => {
    fc.assert(
      fc.property(
        fc.array(fc.record({ p: probability, trials: fc.integer({ min: 0, max: 60 }) }), {
          minLength: 1,
          maxLength: 4
        }),
        fc.double({ min: 0, max: 0.5, noNaN: true }),
        (blocks, rate) => {
          const { first, values, scale } = chainWindow(blocks, rate);
          const pmf = [...new Array<number>(first).fill(0), ...Array.from(values, (value) => value / scale)];
          const want = momentsOf(pmf);
          const { mean, variance } = chainMoments(blocks, rate);
          expect(Math.abs(mean - want.mean)).toBeLessThan(1e-12 * Math.max(1, mean));
          expect(Math.abs(variance - want.variance)).toBeLessThan(1e-11 * Math.max(1, variance));
        }
      )
    );
  });

  it('is the published case: 50 bonds, p = 0.05, ε = 0.01', () => {
    // variance 2.926…, ceiling 3.23…: the ratio 1.239 comes from the formula worked out by hand for equal p.
    const { mean, variance } = chainMoments([{ p: 0.05, trials: 50 }], 0.01);
    expect((variance / (mean * (1 - mean / 50))).toFixed(3)).toBe('1.239');
    expect(mean).toBeCloseTo(50 * (0.05 + 2 * 0.01 * 0.99 * 0.9), 13);
  });
});
