import { lawRate } from '$lib/stats/laws/law-rate';
import { chainRate } from '$lib/stats/misread/chain-rate';
import { chainWindow } from '$lib/stats/misread/chain-window';
import { maximise } from '$lib/stats/numerics/maximise';
import { describe, expect, it } from 'vitest';

const blocks = [
  { p: 0.3, trials: 4 },
  { p: 0.05, trials: 8 }
];

describe('chainRate', () => {
  it('is the supremum over θ of θn − ln Σ f e^{θn}, searched for', () => {
    const { values } = chainWindow(blocks, 0.04, 0, 1);
    for (let n = 1; n < 12; n++) {
      const exponent = (theta: number) =>
        theta * n - Math.log(values.reduce((sum, f, k) => sum + f * Math.exp(theta * k), 0));
      const found = maximise(exponent, -30, 30, 1e-7).value;
      expect(Math.abs(chainRate(blocks, 0.04, n) - found), `n = ${n}`).toBeLessThan(1e-9);
    }
  });

  it('ends at −ln f_n, bounds the tails in between, and is that of the plain law without misreads', () => {
    const { values } = chainWindow(blocks, 0.04, 0, 1);
    expect(chainRate(blocks, 0.04, 0)).toBeCloseTo(-Math.log(values[0]), 11);
    expect(chainRate(blocks, 0.04, 12)).toBeCloseTo(-Math.log(values[12]), 11);
    expect(chainRate(blocks, 0.04, 13)).toBe(Infinity);
    let tail = 0;
    for (let n = 12; n >= 3; n--) {
      tail += values[n];
      expect(tail).toBeLessThanOrEqual(Math.exp(-chainRate(blocks, 0.04, n)) * (1 + 1e-9));
      if (n < 12)
        expect(chainRate(blocks, 0, n)).toBeCloseTo(lawRate({ levels: blocks, poissonPart: 0 }, n), 8);
    }
  });
});
