/**
 * Mean and variance of the kinks read on a ring of N equal bonds with misread sites (see ringWindow), in closed form.
 *
 * With m = 1 − 2p, u = 1 − 2ε and s = ±1 a bond without or with a kink, the even total gives E s = a =
 * (m + m^{N−1})/(1 + m^N) and two bonds the covariance d = m^{N−2}(1 − m²)²/(1 + m^N)². A reading multiplies s by the
 * flips of both sites: mean = ½N(1 − u²a), variance = ¼[N(1 − u⁴a²) + 2N u²(d + a²(1 − u²)) + N(N − 3)u⁴d].
 *
 * @param bonds N ≥ 3
 * @param p kink probability of a bond before its total is taken to be even; below 1 where N is odd
 * @param rate ε of one site
 */
export function ringMoments(bonds: number, p: number, rate: number): { mean: number; variance: number } {
  const m = 1 - 2 * p;
  const below = m ** (bonds - 2);
  const even = 1 + below * m * m;
  const lost = 4 * rate * (1 - rate);
  const square = 1 - lost;
  const a = (m + below * m) / even;
  const d = (below * (1 - m * m) * (1 - m * m)) / (even * even);
  // 1 − a without the digits that 1 − (1 − 2p) loses.
  const kink = (2 * p * (1 - below * m)) / even;
  const read = (lost + square * kink) / 2;
  return {
    mean: bonds * read,
    variance:
      bonds * read * (1 - read) +
      (bonds * square * (d + a * a * lost)) / 2 +
      (bonds * (bonds - 3) * square * square * d) / 4
  };
}
