import { lawDraws } from '$lib/stats/calibration/law-draws';
import { thirdOverMean } from '$lib/stats/claim/third-over-mean';
import { kStatistics } from '$lib/stats/moments/k-statistics';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

const at = (value: number | null, half = 0) => ({
  value,
  low: value === null ? null : value - half,
  high: value === null ? null : value + half
});

describe('thirdOverMean', () => {
  it('has the spread that ratios of drawn histograms have', () => {
    const law = { levels: [{ p: 0.15, trials: 20 }], poissonPart: 0 };
    const shots = 4000;
    const draw = lawDraws(law);
    const ratios: number[] = [];
    const thirds: number[] = [];
    for (let i = 0; i < 3000; i++) {
      const { mean, third } = kStatistics(draw(generator(11, i), shots).counts);
      ratios.push(third! / mean);
      thirds.push(third!);
    }
    // Cumulants of Bin(20, 0.15): 3, 2.55, 1.785, 0.59925.
    const found = thirdOverMean(
      {
        mean: at(3),
        variance: at(2.55),
        third: at(1.785, 1.959964 * deviation(thirds)),
        fourth: at(0.59925)
      },
      shots
    );
    // 3000 repeats give a standard deviation to 1.3 %.
    expect((found.high! - found.low!) / 2 / 1.959964 / deviation(ratios)).toBeCloseTo(1, 1);
    expect(found.value).toBeCloseTo(0.595, 12);
  });

  it('without a fourth cumulant takes the covariance at its worst', () => {
    const moments = { mean: at(3), variance: at(2.55), third: at(1.785, 0.3) };
    const width = (fourth: number | null) => {
      const { low, high } = thirdOverMean({ ...moments, fourth: fourth === null ? null : at(fourth) }, 4000);
      return high! - low!;
    };
    for (const fourth of [-1e6, -3, 0, 0.6, 5, 1e6])
      expect(width(null)).toBeGreaterThanOrEqual(width(fourth) - 1e-12);
    expect(Number.isFinite(width(1e6))).toBe(true);
  });

  it('has no value without a mean or a third cumulant, and no limit without theirs', () => {
    const none = { value: null, low: null, high: null };
    const moments = { mean: at(3), variance: at(2.55), third: at(1.785, 0.3), fourth: at(0.6) };
    expect(thirdOverMean({ ...moments, mean: at(0) }, 100)).toEqual(none);
    expect(thirdOverMean({ ...moments, third: at(null) }, 100)).toEqual(none);
    const open = thirdOverMean({ ...moments, third: { value: 1.785, low: null, high: 2 } }, 100);
    expect(open.low).toBeNull();
    expect(open.high).toBeGreaterThan(open.value!);
  });
});

function deviation(values: number[]): number {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (values.length - 1));
}
