import { stirlingRemainder } from '$lib/stats/random/stirling-remainder';
import { describe, expect, it } from 'vitest';

describe('stirlingRemainder', () => {
  it.each([
    // mpmath 1.3.0, 50 digits: log(factorial(k)) - ((k + 1/2)*log(k) - k + log(2*pi)/2)
    [1, 0.0810614667953273],
    [5, 0.0166446911898212],
    [15, 0.0055547335519628],
    [16, 0.00520765591960964],
    [17, 0.00490139594843474],
    [30, 0.00277767492975269],
    [1000, 8.33333305555563e-5],
    [1000000, 8.33333333333306e-8]
  ])('is exact to 2e-14 at k = %d', (k, expected) => {
    expect(Math.abs(stirlingRemainder(k) - expected)).toBeLessThan(2e-14);
  });
});
