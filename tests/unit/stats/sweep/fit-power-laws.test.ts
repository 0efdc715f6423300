import { commonExponent } from '$lib/stats/sweep/common-exponent';
import { fitPowerLaws, type SweepPoint } from '$lib/stats/sweep/fit-power-laws';
import { describe, expect, it } from 'vitest';
import reference from '../../../../fixtures/reference/power-laws.json';

const points: SweepPoint[] = reference.points.map(({ time, values, covariance }) => ({
  logTime: Math.log(time),
  values,
  covariance
}));

describe('fitPowerLaws', () => {
  it.each([
    ['each with an exponent of its own', false, reference.free],
    ['with one exponent', true, reference.tied]
  ] as const)('finds what SciPy finds, %s', (_, tied, scipy) => {
    const found = fitPowerLaws(points, tied)!;
    const exponents = tied ? [0, 0, 0].map(() => scipy.exponents[0]) : scipy.exponents;
    const errors = tied ? [0, 0, 0].map(() => scipy.errors[0]) : scipy.errors;
    exponents.forEach((b, q) => expect(found.exponents[q]).toBeCloseTo(b, 6));
    errors.forEach((e, q) => expect(found.errors[q] / e).toBeCloseTo(1, 5));
    scipy.logLevels.forEach((c, q) => expect(found.logLevels[q]).toBeCloseTo(c, 6));
    expect(found.chiSquare / scipy.chiSquare).toBeCloseTo(1, 8);
    expect(found.p! / scipy.p).toBeCloseTo(1, 7);
  });

  it('goes through two points, and has no opinion of them', () => {
    const two = [points[0], points[3]].map((point) => ({ ...point, values: point.values.map(Math.abs) }));
    const found = fitPowerLaws(two, false)!;
    const step = two[1].logTime - two[0].logTime;
    two[0].values.forEach((value, q) =>
      expect(found.exponents[q]).toBeCloseTo(Math.log(value / two[1].values[q]) / step, 7)
    );
    expect(found.chiSquare).toBeLessThan(1e-12);
    expect(found.p).toBeNull();
  });

  it('gives nothing for one point, equal times, or errors that cannot be', () => {
    expect(fitPowerLaws(points.slice(0, 1), false)).toBeNull();
    expect(
      fitPowerLaws(
        points.map((point) => ({ ...point, logTime: 1 })),
        false
      )
    ).toBeNull();
    expect(
      fitPowerLaws(
        points.map((point) => ({ ...point, covariance: new Array<number>(9).fill(1) })),
        false
      )
    ).toBeNull();
  });
});

describe('commonExponent', () => {
  it('costs the difference of the two fits', () => {
    const found = commonExponent(points)!;
    expect(found.chiSquare).toBeCloseTo(reference.tied.chiSquare - reference.free.chiSquare, 7);
    expect(found.freedom).toBe(2);
    // exp(−x/2) is the tail of χ² with 2 degrees of freedom.
    expect(found.p).toBeCloseTo(Math.exp(-found.chiSquare / 2), 12);
  });

  it('goes on without a quantity that is not positive', () => {
    const odd = points.map((point) => ({ ...point, values: [point.values[0], point.values[1], -5] }));
    expect(commonExponent(odd)).toMatchObject({ quantities: 2, freedom: 1 });
  });
});
