import { divergenceInterval } from '$lib/stats/fit-report/divergence-interval';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';

describe('divergenceInterval', () => {
  // p̂ = (0.6, 0.4) against f = (½, ½).
  const data = dataOf({ shots: [60, 40], trials: 1 });
  const logLaw = [Math.log(0.5), Math.log(0.5)];
  const plugIn = 0.6 * Math.log(1.2) + 0.4 * Math.log(0.8);

  it('takes off the mean of the divergences under the law, 1.96 standard errors on either side', () => {
    const found = divergenceInterval(data, logLaw, 0, plugIn, [0.004, 0.006, 0.002]);
    expect(found.corrected).toBeCloseTo(plugIn - 0.004, 14);
    // Var(ln p̂/f) = 0.6·0.4·(ln 1.2 − ln 0.8)², over S; and the variance of the three, 4e-6.
    const sampling = (0.24 * Math.log(1.5) ** 2) / 100;
    const reach = 1.96 * Math.sqrt(sampling + 4e-6);
    expect(found.interval.value).toBeCloseTo(plugIn - 0.004, 14);
    expect(found.interval.high).toBeCloseTo(plugIn - 0.004 + reach, 12);
    expect(found.interval.low).toBe(0);
  });

  it('covers the truth of a law far from independent trials, as the plug-in alone would not', () => {
    // Pure noise: D is χ²/2S in the mean, which is what the resamples say, so nothing is left.
    const noise = divergenceInterval(data, logLaw, 0, 0.005, [0.005, 0.004, 0.006, 0.005]);
    expect(noise.corrected).toBeCloseTo(0, 12);
    expect(noise.interval.low).toBe(0);
  });

  it('is never below 0, and keeps low ≤ value ≤ high for counts smoother than chance', () => {
    const smooth = divergenceInterval(data, [Math.log(0.6), Math.log(0.4)], 0, 0, [0.02, 0.025, 0.03]);
    expect(smooth.corrected).toBeLessThan(0);
    expect(smooth.interval).toMatchObject({ value: 0, low: 0 });
    expect(smooth.interval.high).toBeGreaterThan(0);
  });

  it('takes the lump as a cell', () => {
    const lumped = dataOf({ shots: [60], trials: 1, lump: { from: 1, shots: 40 } });
    expect(divergenceInterval(lumped, [Math.log(0.5)], Math.log(0.5), plugIn, [0.004, 0.006])).toEqual(
      divergenceInterval(data, logLaw, 0, plugIn, [0.004, 0.006])
    );
  });
});
