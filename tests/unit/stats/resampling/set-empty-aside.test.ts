import { setEmptyAside } from '$lib/stats/resampling/set-empty-aside';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';

describe('setEmptyAside', () => {
  it('takes the empty shots out, and the counts nobody had up to the next', () => {
    const { rest, empty } = setEmptyAside(dataOf({ shots: [7, 0, 5, 1], trials: 6 }));
    expect(empty).toBe(7);
    expect(rest).toMatchObject({ first: 2, total: 6, withoutEmpty: true, trials: 6 });
    expect([...rest.shots]).toEqual([5, 1]);
  });

  it('changes nothing where no shot was empty, and leaves the lump', () => {
    const data = dataOf({ shots: [0, 0, 5], trials: 9, lump: { from: 4, shots: 2 } });
    const { rest, empty } = setEmptyAside(data);
    expect(empty).toBe(0);
    expect(rest).toMatchObject({ first: 2, total: 7, lump: { from: 4, shots: 2 }, withoutEmpty: true });
    expect(data.withoutEmpty).toBe(false);
  });

  it('leaves nothing of empty shots alone', () => {
    const { rest, empty } = setEmptyAside(dataOf({ shots: [7], trials: 6 }));
    expect(empty).toBe(7);
    expect(rest.total).toBe(0);
    expect(rest.shots).toHaveLength(0);
  });
});
