import { evenProbability } from '$lib/stats/resampling/even-probability';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, enumerate, lawOf } from '../laws/enumerate';

describe('evenProbability', () => {
  it('is the sum of the even terms of the pmf, by enumeration', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 9 }), (p) => {
        const want = enumerate(p).reduce((sum, f, n) => sum + (n % 2 === 0 ? f : 0), 0);
        expect(Math.abs(evenProbability(lawOf(p)) - want)).toBeLessThan(1e-13);
      })
    );
  });

  it('takes multiplicities and a Poisson part: ½(1 + e^{−2γ} Π(1−2p)^m)', () => {
    const law = { levels: [{ p: 0.7, trials: 3 }], poissonPart: 0.3 };
    expect(evenProbability(law)).toBeCloseTo((1 + Math.exp(-0.6) * (-0.4) ** 3) / 2, 14);
    // Poisson alone: e^{−γ} cosh γ.
    expect(evenProbability({ levels: [], poissonPart: 2 })).toBeCloseTo(Math.exp(-2) * Math.cosh(2), 14);
  });
});
