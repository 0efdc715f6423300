import { expect, it } from 'vitest';
import { pairInCounts } from '$lib/stats/sites/pair-in-counts';

it('says that counts of 64 sites and 5000 shots cannot show one pair of correlation 0.05', () => {
  const told = pairInCounts(0.05, 64, 5000);
  // By hand: 0.1/64, and 2.49·√(2·(63/64)/5000).
  expect(told.excess).toBeCloseTo(0.0015625, 12);
  expect(told.smallestExcess).toBeCloseTo(0.04941, 5);
  expect(told.visible).toBe(false);
  expect(told.statement).toContain('by 0.16 %; 5\u202f000 shots see a change of 4.9 % or more.');
  expect(told.statement).toContain('cannot show this pair');
});

it('says that two sites that mostly agree are seen, and refuses one site', () => {
  expect(pairInCounts(0.9, 2, 5000).visible).toBe(true);
  expect(() => pairInCounts(0.1, 1, 5000)).toThrow(RangeError);
});
