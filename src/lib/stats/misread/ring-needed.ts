import { largestRate } from './largest-rate';
import { ringEven } from './ring-even';
import { ringMoments } from './ring-moments';

/**
 * Misread rate ε of a site with which equal independent kinks round a ring have the mean and variance seen; 0
 * where the ring needs none, null where no rate that the mean allows would do.
 */
export function ringNeeded(mean: number, variance: number, bonds: number): number | null {
  const at = (rate: number) => ringMoments(bonds, ringEven(bonds, mean, rate), rate).variance;
  if (variance <= at(0)) return 0;
  // Where misreads alone give that mean.
  const largest = largestRate(mean, bonds, Infinity, 'ring-bonds');
  if (at(largest) < variance) return null;
  let low = 0;
  let high = largest;
  for (let step = 0; step < 60; step++) {
    const middle = (low + high) / 2;
    if (at(middle) < variance) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
