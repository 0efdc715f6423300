import { defaultOptions } from '$lib/stats/default-options';
import { misreads } from '$lib/stats/flags/misreads';
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

  it('is silent for sites, for a ring, and below the ceiling', () => {
    expect(found({ geometry: 'sites' })).toBeNull();
    expect(found({ geometry: 'ring-bonds' })).toBeNull();
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
