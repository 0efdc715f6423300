import { expect, it } from 'vitest';
import { shotsOf } from '$lib/stats/calibration/shots-of';

it('calls once a shot and counts what came', () => {
  const given = [2, 0, 2, 5];
  let next = 0;
  expect(shotsOf(4, () => given[next++])).toEqual({
    kind: 'histogram',
    counts: [
      [0, 1],
      [2, 2],
      [5, 1]
    ],
    lump: null
  });
  expect(next).toBe(4);
});
