import { carefulThird, LEAST_SHOTS } from '$lib/stats/claim/careful-third';
import { expect, it } from 'vitest';

it('carefulThird stretches both halves by 1 + 8/√S, and gives no limit below its least shots', () => {
  const found = carefulThird({ value: 1, low: 0, high: 3 }, 1600);
  expect(found.low).toBeCloseTo(1 - 1.2, 12);
  expect(found.high).toBeCloseTo(1 + 2.4, 12);
  expect(carefulThird({ value: 1, low: null, high: 3 }, 1600).low).toBeNull();
  expect(carefulThird({ value: 1, low: 0, high: 3 }, LEAST_SHOTS - 1)).toEqual({
    value: 1,
    low: null,
    high: null
  });
  expect(carefulThird({ value: null, low: null, high: null }, 1600).value).toBeNull();
});
