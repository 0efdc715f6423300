import { expect, it } from 'vitest';
import { highest, lowest } from './binomial-limits';

it('agree with the quantiles of R 4.2.2', () => {
  // qbinom(.999, c(60, 600, 100), c(.07, .07, .8)); qbinom(.001, c(300, 100, 600), c(.03, .8, .95))
  expect([highest(60, 0.07), highest(600, 0.07), highest(100, 0.8)]).toEqual([11, 62, 91]);
  expect([lowest(300, 0.03), lowest(100, 0.8), lowest(600, 0.95)]).toEqual([1, 67, 552]);
});
