import { tailExcess } from '$lib/stats/resampling/tail-excess';
import { describe, expect, it } from 'vitest';

/** √(2[T ln(T/E) + (S−T) ln((S−T)/(S−E))]): root of twice the binomial deviance. */
function root(seen: number, expected: number, total: number): number {
  const rest = total - seen;
  const other = rest > 0 ? rest * Math.log(rest / (total - expected)) : 0;
  return Math.sqrt(2 * (seen * Math.log(seen / expected) + other));
}

describe('tailExcess', () => {
  // 100 shots at counts 2 … 6 under a law that puts 0.02 below and 0.03 above.
  const shots = Float64Array.of(10, 40, 30, 12, 8);
  const law = Float64Array.of(0.15, 0.4, 0.25, 0.1, 0.05);

  it('takes the largest root over the thresholds outward, on the high side', () => {
    // Beyond 6: 8 seen, 8 expected; beyond 5: 20 seen, 18 expected; beyond 4: 50 seen, 43 expected.
    expect(tailExcess(shots, law, 100, 0.03, 'high', 3)).toBeCloseTo(root(20, 18, 100), 12);
    expect(tailExcess(shots, law, 100, 0.03, 'high', 2)).toBeCloseTo(root(50, 43, 100), 12);
    // With a pocket calculator: 2[20·0.1053605157 − 80·0.0246926126] = 0.2636026.
    expect(tailExcess(shots, law, 100, 0.03, 'high', 3) ** 2).toBeCloseTo(0.2636026, 6);
  });

  it('on the low side from the lowest count up', () => {
    // 10 seen at 2 or less, 17 expected: lighter, so nothing; 50 at 3 or less, 57 expected: nothing.
    expect(tailExcess(shots, law, 100, 0.02, 'low', 1)).toBe(0);
    const heavy = Float64Array.of(30, 30, 20, 12, 8);
    expect(tailExcess(heavy, law, 100, 0.02, 'low', 1)).toBeCloseTo(root(30, 17, 100), 12);
  });

  it('is 0 when nothing lies out there, and counts no shots beyond the range it is given', () => {
    expect(tailExcess(shots, law, 100, 0.03, 'high', 9)).toBe(0);
    expect(tailExcess(shots, law, 100, 0.02, 'low', -1)).toBe(0);
    // A threshold below the first count of a resample: the same as at the first count.
    expect(tailExcess(Float64Array.of(10), Float64Array.of(0.9), 10, 0, 'high', -4)).toBeCloseTo(
      root(10, 9, 10),
      12
    );
  });

  it('scores one shot far out as rarely as it is: 3.4 where a thousandth is expected', () => {
    expect(tailExcess(Float64Array.of(1), Float64Array.of(1e-6), 1000, 0, 'high', 0)).toBeCloseTo(3.44, 2);
  });

  it('stays finite when every shot lies in the tail, or where the law underflows', () => {
    expect(tailExcess(Float64Array.of(50), Float64Array.of(0.5), 50, 0, 'high', 0)).toBeCloseTo(
      Math.sqrt(100 * Math.LN2),
      12
    );
    const none = tailExcess(Float64Array.of(3), Float64Array.of(0), 50, 0, 'high', 0);
    expect(none).toBeGreaterThan(50);
    expect(Number.isFinite(none)).toBe(true);
  });
});
