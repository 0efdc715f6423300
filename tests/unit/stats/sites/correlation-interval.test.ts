import { describe, expect, it } from 'vitest';
import { generator } from '$lib/stats/random/generator';
import { correlationInterval } from '$lib/stats/sites/correlation-interval';

/** Share of simulated pairs whose interval holds the true correlation. */
function coverage(rate: number, phi: number, shots: number, repeats: number): number {
  const random = generator(11, Math.round(1000 * rate + 100_000 * phi));
  const both = rate * rate + phi * rate * (1 - rate);
  let inside = 0;
  for (let repeat = 0; repeat < repeats; repeat++) {
    let [n11, n10, n01] = [0, 0, 0];
    for (let shot = 0; shot < shots; shot++) {
      const u = random.next();
      if (u < both) n11 += 1;
      else if (u < rate) n10 += 1;
      else if (u < 2 * rate - both) n01 += 1;
    }
    const [a, b] = [n11 + n10, n11 + n01];
    const spread = Math.sqrt(a * (shots - a) * b * (shots - b));
    if (spread === 0) continue;
    const ends = correlationInterval((n11 * shots - a * b) / spread, [a / shots, b / shots], shots)!;
    if (ends.low <= phi && phi <= ends.high) inside += 1;
  }
  return inside / repeats;
}

describe('the interval of a correlation', () => {
  it.each([
    [0.5, 0, 500],
    [0.2, 0.05, 1000],
    [0.2, 0.3, 500],
    [0.1, 0.05, 1000],
    [0.05, 0.1, 1000],
    [0.02, 0.1, 1000]
  ])('holds the truth in about 95 of 100 pairs: rate %s, correlation %s, %s shots', (rate, phi, shots) => {
    const held = coverage(rate, phi, shots, 1500);
    // A spread of 0.6 % for 1500 repeats.
    expect(held).toBeGreaterThan(0.93);
    expect(held).toBeLessThan(0.985);
  });

  it('is no wider than what sites of these rates can have, and null without a correlation', () => {
    expect(correlationInterval(null, [0, 0.5], 10)).toBeNull();
    const { low, high } = correlationInterval(1, [0.5, 0.5], 20)!;
    expect(high).toBe(1);
    // 1 − φ = (z²/S)(1 + φ) at rate ½, solved by hand.
    expect(low).toBeCloseTo((20 - 3.8414588) / (20 + 3.8414588), 6);
  });
});
