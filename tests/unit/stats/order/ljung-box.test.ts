import { autocorrelations } from '$lib/stats/order/autocorrelations';
import { ljungBox } from '$lib/stats/order/ljung-box';
import { describe, expect, it } from 'vitest';
import { DISCOVERIES } from './discoveries';

describe('ljungBox', () => {
  it('gives the check value of science.md 11', () => {
    expect(ljungBox(250, [0.085, -0.027, 0.109])).toBeCloseTo(5.043578, 6);
  });

  it('agrees with R on yearly counts of discoveries', () => {
    // R 4.2.2: Box.test(discoveries, lag = 10, type = "Ljung")
    expect(ljungBox(100, autocorrelations(DISCOVERIES, 10))).toBeCloseTo(28.18304917721899, 10);
  });
});
