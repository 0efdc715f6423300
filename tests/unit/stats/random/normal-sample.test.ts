import { generator } from '$lib/stats/random/generator';
import { normalSample } from '$lib/stats/random/normal-sample';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

describe('normalSample', () => {
  it('fills the cells of printed normal tables', () => {
    // Upper quantiles at 50, 40, 30, 20, 10, 5, 2.5, 1, 0.1 % (Fisher & Yates, Statistical Tables; from memory).
    const quantiles = [0, 0.253347, 0.524401, 0.841621, 1.281552, 1.644854, 1.959964, 2.326348, 3.090232];
    const upper = [0.5, 0.4, 0.3, 0.2, 0.1, 0.05, 0.025, 0.01, 0.001];
    const cells = upper.map((p, i) => p - (upper[i + 1] ?? 0));
    const seen = new Float64Array(18);
    const source = generator(66, 0);
    for (let i = 0; i < 300_000; i++) {
      const z = normalSample(source);
      const cell = quantiles.findLastIndex((quantile) => Math.abs(z) >= quantile);
      seen[z < 0 ? 8 - cell : 9 + cell]++;
    }
    expect(Math.abs(chiSquareScore(seen, [...cells].reverse().concat(cells)))).toBeLessThan(4);
  });
});
