import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { convolve } from '$lib/stats/laws/convolve';
import { deepScale, type Window } from '$lib/stats/laws/window';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { relative } from './enumerate';

const anyWindow = fc
  .record({
    first: fc.integer({ min: 0, max: 50 }),
    values: fc.array(fc.double({ min: 1e-12, max: 1, noNaN: true }), { minLength: 1, maxLength: 30 })
  })
  .map(({ first, values }): Window => ({ first, values: Float64Array.from(values), scale: 1 }));

function expectSame(a: Window, b: Window): void {
  expect(a.first).toBe(b.first);
  expect(a.values).toHaveLength(b.values.length);
  a.values.forEach((value, k) => expect(relative(value, b.values[k])).toBeLessThan(1e-13));
}

describe('convolve', () => {
  it('is the sum over all pairs of counts', () => {
    const f = { first: 2, values: Float64Array.of(0.5, 0.25, 0.25), scale: 1 };
    const g = { first: 1, values: Float64Array.of(0.75, 0.25), scale: 1 };
    expect(convolve(f, g)).toEqual({
      first: 3,
      values: Float64Array.of(0.375, 0.3125, 0.25, 0.0625),
      scale: 1
    });
  });

  it('commutes and is associative', () => {
    fc.assert(
      fc.property(anyWindow, anyWindow, anyWindow, (f, g, h) => {
        expectSame(convolve(f, g), convolve(g, f));
        expectSame(convolve(convolve(f, g), h), convolve(f, convolve(g, h)));
      })
    );
  });

  it('adds binomials of one probability to one binomial, 290 decades below 1 as well', () => {
    const sum = convolve(binomialWindow(80, 1e-4), binomialWindow(45, 1e-4));
    const whole = binomialWindow(125, 1e-4);
    expect(sum.scale).toBe(deepScale);
    let deepest = 1;
    sum.values.forEach((value, k) => {
      const want = whole.values[k] / whole.scale;
      if (want < 1e-300) return;
      deepest = want;
      expect(relative(value / sum.scale, want)).toBeLessThan(1e-12);
    });
    expect(deepest).toBeLessThan(1e-290);
  });

  it('cuts off ends under the trim', () => {
    const f = { first: 0, values: Float64Array.of(1e-12, 1, 1e-12), scale: 1 };
    expect(convolve(f, f, 1e-6)).toEqual({ first: 2, values: Float64Array.of(1 + 2e-24), scale: 1 });
  });
});
