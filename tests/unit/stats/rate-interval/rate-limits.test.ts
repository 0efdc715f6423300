import { rateLimits } from '$lib/stats/rate-interval/rate-limits';
import { describe, expect, it } from 'vitest';

describe('rateLimits', () => {
  it('reach z of a hundredth of α to either side', () => {
    // R: qnorm(1 - 0.0001/2) = 3.890592
    const limits = rateLimits(0.01, 0.001, 0.5, 0.01)!;
    expect(limits.miss).toBe(0.0001);
    expect(limits.low).toBeCloseTo(0.01 - 3.890592 * 0.001, 8);
    expect(limits.high).toBeCloseTo(0.01 + 3.890592 * 0.001, 8);
    expect(limits).toMatchObject({ rate: 0.01, uncertainty: 0.001, cutByCounts: false });
  });

  it('end at 0 and at what the counts allow, and are none where the counts refute them all', () => {
    expect(rateLimits(0.01, 0.01, 0.02, 0.01)).toMatchObject({ low: 0, high: 0.02, cutByCounts: true });
    // The rate stated is more than the counts allow, but not by more than its uncertainty.
    expect(rateLimits(0.025, 0.01, 0.02, 0.01)).toMatchObject({ rate: 0.02, high: 0.02, cutByCounts: true });
    expect(rateLimits(0.025, 0.001, 0.02, 0.01)).toBeNull();
  });

  it('are the rate itself where it is exact', () => {
    expect(rateLimits(0.01, 0, 0.02, 0.05)).toMatchObject({ low: 0.01, high: 0.01 });
    expect(rateLimits(0.03, 0, 0.02, 0.05)).toBeNull();
  });
});
