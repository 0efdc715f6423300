import { misreadNeeded } from '$lib/stats/flags/misread-needed';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { openBonds } from './misread-chain';

/** Mean and variance of kinks read with flips, by the formula: m = 1 − 2p, u = 1 − 2ε. */
function formula(bonds: number, p: number, flips: number) {
  const [m, u] = [1 - 2 * p, 1 - 2 * flips];
  const mean = bonds * (p + 2 * flips * (1 - flips) * (1 - 2 * p));
  const variance = 0.25 * (bonds * (1 - m ** 2 * u ** 4) + 2 * (bonds - 1) * m ** 2 * u ** 2 * (1 - u ** 2));
  return { mean, variance };
}

describe('misreadNeeded', () => {
  it('undoes the formula for mean and variance', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 500 }),
        fc.double({ min: 0.001, max: 0.4, noNaN: true }),
        fc.double({ min: 0.0005, max: 0.1, noNaN: true }),
        (bonds, p, flips) => {
          const { mean, variance } = formula(bonds, p, flips);
          expect(Math.abs(misreadNeeded(mean, variance, bonds)! - flips)).toBeLessThan(1e-8);
        }
      )
    );
  });

  it('rests on a formula that counting every chain and every flip confirms', () => {
    for (const [bonds, p, flips] of [
      [4, 0.2, 0.1],
      [6, 0.05, 0.03],
      [3, 0.4, 0.25]
    ]) {
      const pmf = openBonds(bonds, p, flips);
      const mean = pmf.reduce((sum, f, n) => sum + n * f, 0);
      const variance = pmf.reduce((sum, f, n) => sum + (n - mean) ** 2 * f, 0);
      const want = formula(bonds, p, flips);
      expect(mean).toBeCloseTo(want.mean, 12);
      expect(variance).toBeCloseTo(want.variance, 12);
      // And that chain against all 2^bonds·2^sites outcomes.
      expect(pmf).toEqual(byHand(bonds, p, flips).map((f) => expect.closeTo(f, 12)));
    }
  });

  it('says that 1 % of misreads make 50 bonds at p = 0.05 look 1.239 times too dispersed', () => {
    const { mean, variance } = formula(50, 0.05, 0.01);
    expect(variance / (mean * (1 - mean / 50))).toBeCloseTo(1.239, 3);
    expect(misreadNeeded(mean, variance, 50)).toBeCloseTo(0.01, 10);
  });

  it('is null at or below the ceiling, and for an excess that no flips reach', () => {
    expect(misreadNeeded(5, 4.499, 50)).toBeNull();
    expect(misreadNeeded(5, 4, 50)).toBeNull();
    // All of a mean of 5 from flips alone, p = 0, is the most dispersed that misreads can make.
    expect(misreadNeeded(5, 40, 50)).toBeNull();
    expect(misreadNeeded(26, 30, 50)).toBeNull();
    expect(misreadNeeded(0.5, 0.4, 1)).toBeNull();
  });
});

/** All kink patterns and all flip patterns of a short chain, one by one. */
function byHand(bonds: number, p: number, flips: number): number[] {
  const pmf = new Array<number>(bonds + 1).fill(0);
  for (let kinks = 0; kinks < 2 ** bonds; kinks++) {
    for (let wrong = 0; wrong < 2 ** (bonds + 1); wrong++) {
      let probability = 1;
      let count = 0;
      for (let site = 0; site <= bonds; site++) probability *= (wrong >> site) & 1 ? flips : 1 - flips;
      for (let bond = 0; bond < bonds; bond++) {
        const kink = (kinks >> bond) & 1;
        probability *= kink ? p : 1 - p;
        count += kink ^ ((wrong >> bond) & 1) ^ ((wrong >> (bond + 1)) & 1);
      }
      pmf[count] += probability;
    }
  }
  return pmf;
}
