import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { meanFixesVariance } from '$lib/stats/nulls/mean-fixes-variance';
import { describe, expect, it } from 'vitest';

describe('counts of two values', () => {
  it('are those of one trial, and those of a cut that leaves two', () => {
    expect(meanFixesVariance(1, null)).toBe(true);
    expect(meanFixesVariance(2, null)).toBe(false);
    expect(meanFixesVariance(null, null)).toBe(false);
    expect(meanFixesVariance(20, { from: 0, to: 1 })).toBe(true);
    expect(meanFixesVariance(20, { from: 0, to: 2 })).toBe(false);
    expect(meanFixesVariance(20, { from: 19, to: Infinity })).toBe(true);
  });

  it('say nothing of an excess, however many shots there are', async () => {
    const of = async (shots: [number, number][]) =>
      diagnose(
        { kind: 'histogram', counts: shots, lump: null },
        { ...defaultOptions, trials: 20, kept: { from: 0, to: 1 }, resamples: 199 }
      );
    const { answer, notRun, tests } = await of([
      [0, 4000],
      [1, 2000]
    ]);
    expect(answer.verdict).toBe('undecided');
    expect(answer.smallestExcess).toBeNull();
    expect(tests.map(({ id }) => id)).not.toContain('ceiling');
    expect(notRun.find(({ id }) => id === 'ceiling')?.reason).toMatch(/the mean fixes the variance/);
  });
});
