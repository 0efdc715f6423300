/** Dekker's splitter for 53-bit numbers, 2^27 + 1. */
const splitter = 134217729;

/**
 * k − n·p rounded once, as a fused multiply-add would give it.
 *
 * @param k, n counts up to about 1e290; p a probability
 *
 * With n near 2^53 the product alone is rounded by up to half a count, a part 1e-8 of the standard
 * deviation; tails held to 1e-10 cannot bear that. Not exact below 1e-290, where it does not matter.
 * Source: Dekker 1971, A floating-point technique for extending the available precision.
 */
export function productDifference(k: number, n: number, p: number): number {
  const product = n * p;
  const nLarge = highHalf(n);
  const nSmall = n - nLarge;
  const pLarge = highHalf(p);
  const pSmall = p - pLarge;
  const lost = nSmall * pSmall - (product - nLarge * pLarge - nSmall * pLarge - nLarge * pSmall);
  return k - product - lost;
}

function highHalf(x: number): number {
  const scaled = splitter * x;
  return scaled - (scaled - x);
}
