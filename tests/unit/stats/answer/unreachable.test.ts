import { resamplesNeeded, unreachable } from '$lib/stats/answer/unreachable';
import { defaultOptions } from '$lib/stats/default-options';
import { describe, expect, it } from 'vitest';
import { ran } from '../flags/make-evidence';

describe('unreachable', () => {
  it('finds tests at their smallest p that adjustment still lifts above α', () => {
    const blind = { ...ran('fit', 0.06), p: 0.01, smallestP: 0.01, resamples: 99 };
    const clear = { ...ran('ceiling', 0.003), p: 0.0005 };
    const exact = { ...ran('order', 0.06), p: 0, smallestP: 0, resamples: 0 };
    const tests = [blind, clear, exact, ran('parity', 0.6)];
    expect(unreachable({ tests, options: defaultOptions })).toEqual([blind]);
    expect(unreachable({ tests: [clear], options: defaultOptions })).toEqual([]);
  });

  it('knows how many resamples would do: tests/α, less one', () => {
    const tests = [ran('fit', 0.5), ran('parity', 0.5), ran('ceiling', 0.5)];
    const needed = resamplesNeeded({ tests, options: defaultOptions });
    expect(needed).toBe(300);
    expect((tests.length * 1) / (needed + 1)).toBeLessThanOrEqual(0.01);
  });
});
