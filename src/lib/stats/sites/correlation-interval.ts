import { findRoot } from '../numerics/find-root';

const z = 1.959963984540054;

/**
 * 95 % interval of the correlation (phi coefficient) of two sites: the values φ from which the observed one is within
 * 1.96 standard errors, the error taken at φ itself and not at the estimate, as in a score interval.
 *
 * S·variance of the sample phi under multinomial sampling, with rates p and q: 1 − φ² + φ(1 + φ²/2)·g − ¾φ²·h, where
 * g = (1 − 2p)(1 − 2q)/√(p(1−p)q(1−q)) and h = (1 − 2p)²/(p(1−p)) + (1 − 2q)²/(q(1−q)). For rare bits the term in φ is
 * large: Fisher's z leaves it out. Ends stay within what sites of these rates can have.
 *
 * @param correlation observed, null gives null
 * @param rates of the two sites, inside 0 … 1
 *
 * Source: variance from Bishop, Fienberg & Holland 1975, Discrete Multivariate Analysis, section 11.3 (from memory,
 * held against simulation in the tests).
 */
export function correlationInterval(
  correlation: number | null,
  [p, q]: [number, number],
  shots: number
): { low: number; high: number } | null {
  if (correlation === null) return null;
  const spread = Math.sqrt(p * (1 - p) * q * (1 - q));
  const least = (Math.max(0, p + q - 1) - p * q) / spread;
  const most = (Math.min(p, q) - p * q) / spread;
  const g = ((1 - 2 * p) * (1 - 2 * q)) / spread;
  const h = (1 - 2 * p) ** 2 / (p * (1 - p)) + (1 - 2 * q) ** 2 / (q * (1 - q));
  const outside = (phi: number) => {
    const variance = 1 - phi * phi + phi * (1 + (phi * phi) / 2) * g - 0.75 * phi * phi * h;
    return (correlation - phi) ** 2 - (z * z * Math.max(0, variance)) / shots;
  };
  // Where every shot agrees the error is 0 at the estimate itself, which is then a root but no end.
  const from = (end: number) => correlation + 1e-9 * (end - correlation);
  const endAt = (end: number) => {
    if (outside(end) <= 0) return end;
    return outside(from(end)) >= 0 ? correlation : findRoot(outside, end, from(end));
  };
  return { low: endAt(least), high: endAt(most) };
}
