import { baseMeasure } from '$lib/stats/floor/base-measure';
import { forEachCount, knotFit } from '$lib/stats/floor/knot-fit';
import { describe, expect, it } from 'vitest';

describe('knotFit', () => {
  it('with a knot at every count is the data itself', () => {
    const weights = Float64Array.of(0.2, 0.5, 0.3);
    const base = baseMeasure(2, 0, 2);
    const { values } = knotFit(weights, base, [0, 1, 2], new Float64Array(3));
    values.forEach((value, n) => expect(Math.exp(value + base[n])).toBeCloseTo(weights[n], 9));
  });

  it('with knots at the ends is the binomial law of the same mean', () => {
    // ln f − ln C straight: f ∝ C(N, n) odds^n.
    const weights = Float64Array.of(0.1, 0.2, 0.3, 0.4);
    const base = baseMeasure(3, 0, 3);
    const { values } = knotFit(weights, base, [0, 3], new Float64Array(2));
    const p = 2 / 3;
    expect(values[0]).toBeCloseTo(3 * Math.log(1 - p), 7);
    expect(values[1]).toBeCloseTo(3 * Math.log(p), 7);
  });
});

describe('forEachCount', () => {
  it('visits each count once, with its place between knots', () => {
    const visits: [number, number, number][] = [];
    forEachCount([0, 2, 3], (n, knot, share) => visits.push([n, knot, share]));
    expect(visits).toEqual([
      [0, 0, 0],
      [1, 0, 0.5],
      [2, 1, 0],
      [3, 2, 0]
    ]);
  });
});
