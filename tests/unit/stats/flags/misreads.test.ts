import { defaultOptions } from '$lib/stats/default-options';
import { misreads } from '$lib/stats/flags/misreads';
import { ringMoments } from '$lib/stats/misread/ring-moments';
import type { DiagnoseOptions } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { evidence, interval } from './make-evidence';

/** Mean and variance of 20 bonds, p = 0.2, misread at 3 %. */
function found(options: Partial<DiagnoseOptions>, p = 0.001, variance = 1) {
  const [m, u] = [1 - 2 * 0.2, 1 - 2 * 0.03];
  const mean = 10 * (1 - m * u * u);
  const seen = 0.25 * (20 * (1 - m ** 2 * u ** 4) + 38 * m ** 2 * u ** 2 * (1 - u ** 2)) * variance;
  const base = evidence({ p: { ceiling: p } });
  const moments = { ...base.moments, mean: interval(mean), variance: interval(seen) };
  return misreads({
    ...base,
    moments,
    options: { ...defaultOptions, trials: 20, geometry: 'open-bonds', ...options }
  });
}

describe('misreads', () => {
  it('hints at the misread rate that would do, for kinks on an open chain', () => {
    const flag = found({})!;
    expect(flag.grade).toBe('hinted');
    expect(flag.size).toContain('3.0\u202f%');
    expect(flag.size).not.toContain('stated');
  });

  it('hints at the rate of a ring as well, where no count is odd', () => {
    const { mean, variance } = ringMoments(20, 0.2, 0.03);
    const even = { seen: 2000, expected: 0.5, oneCountAlone: false };
    const base = evidence({ p: { ceiling: 0.001 }, over: { shots: 2000, even } });
    const moments = { ...base.moments, mean: interval(mean), variance: interval(variance) };
    const options = { ...defaultOptions, trials: 20, geometry: 'ring-bonds' as const };
    const ring = { ...base, moments, options };
    expect(misreads(ring)!.size).toContain('3.0\u202f%');
    expect(misreads({ ...ring, even: { ...even, seen: 1999 } })).toBeNull();
    expect(misreads({ ...ring, options: { ...options, unit: 'pair' } })).toBeNull();
  });

  it('is silent for sites and below the ceiling', () => {
    expect(found({ geometry: 'sites' })).toBeNull();
    expect(found({}, 0.5)).toBeNull();
  });

  it('is silent when more than a tenth of the sites would have to be misread', () => {
    expect(found({}, 0.001, 2)).toBeNull();
  });

  it('weighs a stated rate: near the needed one it is named, well short it speaks against', () => {
    expect(found({ misread: 0.028 })!.size).toContain('You stated 2.8\u202f%');
    expect(found({ misread: 0.01 })).toBeNull();
    expect(found({ misread: 0 })).toBeNull();
  });
});
