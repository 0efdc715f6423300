import { gateRates } from '$lib/stats/calibration/gate-rates';
import { describe, expect, it } from 'vitest';

const asked = { runs: 20, shots: 8000, versions: 1, tolerance: 0.1, alpha: 0.05, seed: 62 };

describe('gateRates', () => {
  // One σ of ln D is √(2·(63/64)/8000) = 0.0157, and enlarged by the rise itself: 1.15 is 6 of a difference above 1.
  it.each([1.15, 1.3])('a rise to %d of the ceiling in one group of eight fails nearly always', (rise) => {
    expect(gateRates({ ...asked, rise }).failed).toBeGreaterThanOrEqual(0.95);
  });

  it('no change at all passes nearly always, and shares add up to 1', () => {
    const { failed, undecided, passed } = gateRates({ ...asked, rise: 1 });
    expect(passed).toBeGreaterThanOrEqual(0.8);
    expect(failed + undecided + passed).toBeCloseTo(1, 12);
  });
});
