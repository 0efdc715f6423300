import { rounded, roundedAll, roundedOutward } from '$lib/model/link/rounded';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

describe('roundedOutward', () => {
  it.each([
    // Width 0.56: hundredths.
    [[104.977, 104.7034, 105.2561], Infinity, [104.98, 104.7, 105.26]],
    // Width 9.7: tenths; thousands stay where they are.
    [[1234.56, 1230.04, 1239.71], Infinity, [1234.6, 1230, 1239.8]],
    [[0.000_51, 0, 0.00179], Infinity, [0.0005, 0, 0.0018]],
    // One open end: twice the other half.
    [[3.21456, 3.1, null], Infinity, [3.21, 3.09, null]],
    // No width: three digits, or as many as are asked for.
    [[0.012_34, 0.012_34, 0.012_34], Infinity, [0.0123, 0.0123, 0.0124]],
    [[0.012_34, 0.012_34, 0.012_34], 2, [0.012, 0.012, 0.013]],
    [[0.0125, 0.0083, 0.018], 2, [0.013, 0.008, 0.019]],
    [[0, 0, 0], Infinity, [0, 0, 0]],
    [[null, null, null], Infinity, [null, null, null]]
  ])('%j at most %d digits', ([value, low, high], most, [near, down, up]) =>
    expect(roundedOutward({ value: value!, low, high }, most)).toEqual({ value: near, low: down, high: up })
  );

  it('never narrows an interval, nor brings a limit nearer to the value', () => {
    const random = generator(7, 1);
    for (let i = 0; i < 2000; i++) {
      const value = 10 ** (6 * random.next() - 3);
      const low = value - 10 ** (4 * random.next() - 4);
      const high = value + 10 ** (4 * random.next() - 4);
      const slack = 1e-8 * (high - low) + 1e-12 * value;
      const all = roundedOutward({ value, low, high });
      expect(all.low!).toBeLessThanOrEqual(low + slack);
      expect(all.high!).toBeGreaterThanOrEqual(high - slack);
      expect(low < 0 || all.low === 0 || all.value! - all.low! >= value - low - slack).toBe(true);
      expect(all.high! - all.value!).toBeGreaterThanOrEqual(high - value - slack);
      expect(all.high! - all.low!).toBeLessThanOrEqual((high - low) * 1.4);
    }
  });
});

it('rounds every number of a thing, intervals by their width, and leaves words', () => {
  const thing = {
    a: 0.0771139,
    b: [1234567, { c: 'about 1234', d: null }],
    e: { value: 104.977, low: 104.7034, high: 105.2561 }
  };
  expect(roundedAll(thing)).toEqual({
    a: 0.0771,
    b: [1230000, { c: 'about 1234', d: null }],
    e: { value: 104.98, low: 104.7, high: 105.26 }
  });
  expect(rounded(-0.012345, 2)).toBe(-0.012);
});
