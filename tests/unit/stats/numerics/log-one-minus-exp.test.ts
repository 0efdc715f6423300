import { logOneMinusExp } from '$lib/stats/numerics/log-one-minus-exp';
import { describe, expect, it } from 'vitest';

describe('logOneMinusExp', () => {
  it('is its own inverse', () => {
    for (const x of [-1e-12, -1e-3, -0.5, -0.69, -0.7, -2, -30]) {
      expect(logOneMinusExp(logOneMinusExp(x)) / x).toBeCloseTo(1, 12);
    }
  });

  it('keeps digits at both ends', () => {
    // ln(1 − e^{−x}) ≈ ln x − x/2 for small x, −e^{−x} for large x.
    expect(logOneMinusExp(-1e-15)).toBeCloseTo(Math.log(1e-15) - 5e-16, 13);
    expect(logOneMinusExp(-100)).toBeCloseTo(-Math.exp(-100), 58);
    expect(logOneMinusExp(0)).toBe(-Infinity);
    expect(logOneMinusExp(-Infinity)).toBe(-0);
    expect(logOneMinusExp(1)).toBeNaN();
  });
});
