import { defaultOptions } from '$lib/stats/default-options';
import type { Evidence } from '$lib/stats/flags/evidence';
import type { Interval, TestId, TestResult } from '$lib/stats/types';

const interval = (value: number, low = value * 0.95, high = value * 1.05): Interval => ({ value, low, high });

/** A test that ran, with this adjusted p. */
export function ran(id: TestId, pAdjusted: number): TestResult {
  const source = id === 'batches' || id === 'order' ? 'permuted' : 'resampled';
  return {
    id,
    statistic: 3,
    p: pAdjusted / 6,
    pAdjusted,
    smallestP: 1 / 2000,
    source,
    resamples: 1999,
    stoppedEarly: false
  };
}

export const quiet: Partial<Record<TestId, number>> = {
  ceiling: 0.8,
  fit: 0.8,
  'high-tail': 0.8,
  'low-tail': 0.8,
  parity: 0.8,
  'empty-shots': 0.8
};

export interface Made {
  /** Adjusted p of each test that ran, over the quiet ones; undefined takes a test out. */
  p?: Partial<Record<TestId, number | undefined>>;
  dispersion?: Interval;
  over?: Partial<Evidence>;
}

/** Evidence of 3000 shots of N = 20 about equal trials, where nothing was found, changed as asked. */
export function evidence({ p = {}, dispersion = interval(1), over = {} }: Made = {}): Evidence {
  const found = Object.entries({ ...quiet, ...p }) as [TestId, number | undefined][];
  const ceiling = 4.2;
  return {
    options: { ...defaultOptions, trials: 20 },
    shots: 3000,
    trials: 20,
    moments: {
      mean: interval(6),
      variance: interval(ceiling * dispersion.value!),
      third: interval(1),
      fourth: interval(1),
      fano: interval(0.7),
      ceiling,
      dispersion,
      pairCovariance: ceiling * (dispersion.value! - 1)
    },
    tests: found.filter(([, value]) => value !== undefined).map(([id, value]) => ran(id, value!)),
    certificate: null,
    lowTailOfTheRest: 0.5,
    neighbours: null,
    empty: { seen: 3, expected: 2.4 },
    even: { seen: 1490, expected: 0.5, oneCountAlone: true },
    ...over
  };
}

export { interval };
