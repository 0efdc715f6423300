import { ringMoments } from './ring-moments';

/**
 * Kink probability of equal bonds of a ring that are read with this mean, or the nearest to it that kinks can give. The
 * mean rises with p, from the misreads alone, N·2ε(1 − ε).
 */
export function ringEven(bonds: number, mean: number, rate: number): number {
  let low = 0;
  // A ring of an odd number of bonds cannot hold a kink on each.
  let high = bonds % 2 === 0 ? 1 : 1 - 1e-9;
  for (let step = 0; step < 60 && high - low > 1e-15 * high; step++) {
    const middle = (low + high) / 2;
    if (ringMoments(bonds, middle, rate).mean < mean) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
