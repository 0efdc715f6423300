import { ringEven } from '$lib/stats/misread/ring-even';
import { ringMoments } from '$lib/stats/misread/ring-moments';
import { describe, expect, it } from 'vitest';
import { everyReading, momentsOf } from './every-reading';

describe('ringMoments', () => {
  it('agrees with counting every even chain and every reading to 1e-12, N = 3 … 8', () => {
    for (let bonds = 3; bonds <= 8; bonds++) {
      for (const rate of [0, 0.01, 0.09, 0.3]) {
        for (const p of [0, 0.003, 0.05, 0.3, 0.5, 0.8]) {
          const want = momentsOf(everyReading(new Array<number>(bonds).fill(p), rate, true));
          const { mean, variance } = ringMoments(bonds, p, rate);
          expect(Math.abs(mean - want.mean), `mean, N = ${bonds}, p = ${p}`).toBeLessThan(1e-12);
          expect(Math.abs(variance - want.variance), `variance, N = ${bonds}, p = ${p}`).toBeLessThan(1e-12);
        }
      }
    }
  });
});

describe('ringEven', () => {
  it('finds the p of equal bonds from their mean, and moves a mean that none gives to the nearest', () => {
    for (const bonds of [3, 4, 7, 8, 100, 1000]) {
      for (const rate of [0, 0.01, 0.09]) {
        for (const p of [0.001, 0.05, 0.4, 0.7]) {
          expect(ringEven(bonds, ringMoments(bonds, p, rate).mean, rate)).toBeCloseTo(p, 10);
        }
        expect(ringEven(bonds, 0, rate)).toBeLessThan(1e-14);
        expect(ringEven(bonds, bonds, rate)).toBeGreaterThan(1 - 1e-8);
      }
    }
  });
});
