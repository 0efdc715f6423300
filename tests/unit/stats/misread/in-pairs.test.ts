import { inPairs } from '$lib/stats/misread/in-pairs';
import { kinksOf } from '$lib/stats/misread/kinks-of';
import { ringWindow } from '$lib/stats/misread/ring-window';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

describe('inPairs', () => {
  it('puts an even count at half of it, where a window begins late too', () => {
    const want = everyReading([0.1, 0.4, 0.2, 0.6, 0.3], 0.03, true);
    const { first, values, scale } = inPairs(
      ringWindow(
        [0.1, 0.4, 0.2, 0.6, 0.3].map((p) => ({ p, trials: 1 })),
        0.03
      ),
      'pair'
    );
    expect([first, values.length]).toEqual([0, 3]);
    values.forEach((value, i) => expect(value / scale).toBeCloseTo(want[2 * i], 13));
    const late = { first: 4, values: new Float64Array([1, 0, 3]), scale: 4 };
    expect(inPairs(late, 'pair')).toEqual({ first: 2, values: new Float64Array([1, 3]), scale: 4 });
    expect(inPairs(late, 'defect')).toEqual(late);
  });
});

describe('kinksOf', () => {
  it('tells pairs as single kinks', () => {
    const data = {
      first: 1,
      shots: Float64Array.from([2, 0, 2]),
      total: 4,
      trials: 5,
      lump: null,
      below: null,
      withoutEmpty: false
    };
    // Counts 1, 1, 3, 3: mean 2 and variance 1 or 4/3 of pairs.
    const single = kinksOf(data);
    const pairs = kinksOf(data, 'pair');
    expect(single.moments.mean).toBe(2);
    expect(pairs.moments.mean).toBe(4);
    expect(pairs.moments.variance).toBe(4 * single.moments.variance);
    expect([single.bonds, pairs.bonds]).toEqual([5, 10]);
  });
});
