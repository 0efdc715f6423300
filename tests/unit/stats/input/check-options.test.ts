import { defaultOptions } from '$lib/stats/default-options';
import { checkOptions } from '$lib/stats/input/check-options';
import { BadInput, type DiagnoseOptions } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const check = (changed: Partial<Record<keyof DiagnoseOptions, unknown>>) => () =>
  checkOptions({ ...defaultOptions, ...changed } as DiagnoseOptions);

describe('checkOptions', () => {
  it('takes what is assumed when nothing is said, and the ends of each range', () => {
    expect(check({})).not.toThrow();
    expect(
      check({ trials: 1, alpha: 0.49, tolerance: 10, resamples: 19, seed: 0, misread: 0 })
    ).not.toThrow();
    expect(check({ trials: 1e9, resamples: 1e6, seed: 2 ** 32 - 1, misread: 0.499 })).not.toThrow();
    expect(check({ trials: 3, supplied: [0, 0.5, 1] })).not.toThrow();
    expect(check({ trials: 6, unit: 'pair', supplied: [0, 0.5, 1] })).not.toThrow();
    expect(check({ trials: null, supplied: [0.5] })).not.toThrow();
  });

  it.each<[Partial<Record<keyof DiagnoseOptions, unknown>>, RegExp]>([
    [{ trials: 0 }, /trials/],
    [{ trials: 1.5 }, /trials/],
    [{ trials: NaN }, /trials/],
    [{ trials: 1e10 }, /trials/],
    [{ trials: undefined }, /trials/],
    [{ alpha: 0 }, /alpha/],
    [{ alpha: 0.5 }, /alpha/],
    [{ alpha: NaN }, /alpha/],
    [{ tolerance: 0 }, /tolerance/],
    [{ tolerance: 11 }, /tolerance/],
    [{ resamples: 18 }, /resamples/],
    [{ resamples: 99.5 }, /resamples/],
    [{ resamples: 1e7 }, /resamples/],
    [{ seed: -1 }, /seed/],
    [{ seed: 2 ** 32 }, /seed/],
    [{ misread: -0.01 }, /misread/],
    [{ misread: 0.5 }, /misread/],
    [{ misread: NaN }, /misread/],
    [{ misread: 0.01, misreadUncertainty: -0.001 }, /uncertainty of the misread rate/],
    [{ misread: 0.01, misreadUncertainty: 0.5 }, /uncertainty of the misread rate/],
    [{ misread: 0.01, misreadUncertainty: NaN }, /uncertainty of the misread rate/],
    [{ misread: null, misreadUncertainty: 0.001 }, /without the rate/],
    [{ unit: 'kink' }, /unit/],
    [{ geometry: 'ring' }, /geometry/],
    [{ supplied: [0.5, 1.1], trials: 2 }, /between 0 and 1/],
    [{ supplied: [NaN], trials: 1 }, /between 0 and 1/],
    [{ supplied: [], trials: null }, /from 1 to/],
    [{ supplied: [0.5], trials: 2 }, /1 probabilities, but there are 2 trials/]
  ])('refuses %j in words', (changed, reason) => {
    expect(check(changed)).toThrow(BadInput);
    expect(check(changed)).toThrow(reason);
  });
});
