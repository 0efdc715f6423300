import { quenchExponent } from '$lib/stats/sweep/quench-exponent';
import { UNIVERSALITY_CLASSES } from '$lib/stats/sweep/universality-classes';
import { describe, expect, it } from 'vitest';

describe('quenchExponent', () => {
  it.each([
    // Dziarmaga 2005: the density of kinks falls as τ^−½.
    ['ising-chain', 1 / 2],
    // Laguna & Zurek 1998, Phys. Rev. D 58:085021: ¼ overdamped and ⅓ underdamped (m).
    ['mean-field-chain', 1 / 4],
    ['mean-field-inertial-chain', 1 / 3],
    // By hand: 2/3.1665.
    ['ising-plane', 0.631612]
  ])('of %s is %f', (id, exponent) => {
    const { dimension, correlation, dynamic } = UNIVERSALITY_CLASSES.find((one) => one.id === id)!;
    expect(quenchExponent(dimension, correlation, dynamic)).toBeCloseTo(exponent, 6);
  });

  it('asks for positive numbers', () => {
    expect(() => quenchExponent(1, 0, 1)).toThrow(RangeError);
    expect(() => quenchExponent(-1, 1, 1)).toThrow('-1');
    expect(() => quenchExponent(1, 1, Infinity)).toThrow(RangeError);
  });
});
