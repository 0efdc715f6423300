import type { Generator } from './generator';

/**
 * One draw from the standard normal law by the polar method: a point uniform in the unit disc, scaled. The second
 * number that the method yields is thrown away, so that a draw leaves nothing behind in the generator.
 *
 * Source: Marsaglia & Bray 1964, SIAM Review 6:260.
 */
export function normalSample(generator: Generator): number {
  for (;;) {
    const x = 2 * generator.next() - 1;
    const y = 2 * generator.next() - 1;
    const square = x * x + y * y;
    // The centre is excluded: its logarithm is infinite.
    if (square < 1 && square > 0) return x * Math.sqrt((-2 * Math.log(square)) / square);
  }
}
