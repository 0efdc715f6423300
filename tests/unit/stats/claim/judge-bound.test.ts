import { judgeBound } from '$lib/stats/claim/judge-bound';
import { describe, expect, it } from 'vitest';

const p = { value: 0.02, low: 0.014, high: 0.027 };

describe('judgeBound', () => {
  it.each([
    [0.03, 'agrees'],
    [0.027, 'agrees'],
    [0.0269, 'cannot-tell'],
    [0.014, 'cannot-tell'],
    [0.0139, 'disagrees']
  ])('less than %f: %s', (bound, verdict) => expect(judgeBound(p, bound)).toBe(verdict));

  it('takes a missing end for as far as can be', () => {
    expect(judgeBound({ value: 1, low: null, high: 2 }, 0.5)).toBe('cannot-tell');
    expect(judgeBound({ value: 1, low: 0.5, high: null }, 9)).toBe('cannot-tell');
    expect(judgeBound({ value: null, low: null, high: null }, 9)).toBe('cannot-tell');
    expect(() => judgeBound(p, NaN)).toThrow(RangeError);
  });
});
