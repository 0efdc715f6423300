import type { Level } from '../types';

/**
 * Large-deviation rate of a count under the law of misread kinks, sup_θ [θn − ln G(e^θ)] in nats a shot; e^{−rate} is
 * Chernoff's bound of its tail, as for any law.
 *
 * @param blocks kink probabilities in the order of the bonds
 * @param rate ε of one site
 * @param count 0 … N
 * @returns ≥ 0; at the ends of the support −ln f_n; Infinity where the count is impossible
 *
 * G and its derivatives by stepping along the chain, weights of a bond read and not read scaled so that the larger is 1.
 */
export function chainRate(blocks: readonly Level[], rate: number, count: number): number {
  const bonds = blocks.reduce((sum, { trials }) => sum + trials, 0);
  if (!(count >= 0 && count <= bonds)) return Infinity;
  if (count === 0) return -logSum(blocks, rate, 1, 0).log;
  if (count === bonds) return -logSum(blocks, rate, 0, 1).log;
  let low = -Infinity;
  let high = Infinity;
  let theta = 0;
  let cut = 2;
  let value = 0;
  for (let step = 1; step <= 200; step++) {
    const [idle, read] = theta > 0 ? [Math.exp(-theta), 1] : [1, Math.exp(theta)];
    const { log, mean, variance } = logSum(blocks, rate, idle, read);
    value = theta * count - (log + Math.max(0, theta) * bonds);
    const gap = count - mean;
    if (Math.abs(gap) <= 1e-12 * Math.max(1, count)) break;
    if (gap > 0) low = theta;
    else high = theta;
    const bracketed = high - low < Infinity;
    // A chain that cannot reach the count pushes θ away without end.
    if (!bracketed && Math.abs(theta) > 1400) return value > 700 ? Infinity : Math.max(0, value);
    let next = theta + Math.max(-cut, Math.min(cut, variance > 0 ? gap / variance : Math.sign(gap) * cut));
    if (bracketed && ((step > 12 && step % 3 === 0) || !(next > low && next < high))) next = (low + high) / 2;
    if (!bracketed) cut *= 2;
    if (next === theta) break;
    theta = next;
  }
  return Math.max(0, value);
}

/** ln Σ_n f_n idle^{N−n} read^n, and mean and variance of the law so weighed. */
function logSum(
  blocks: readonly Level[],
  rate: number,
  idle: number,
  read: number
): { log: number; mean: number; variance: number } {
  // Sums by the flip of the last site, of 1, n and n².
  let [f, g, f1, g1, f2, g2] = [1 - rate, rate, 0, 0, 0, 0];
  let log = 0;
  const up = 1 - rate;
  for (const { p, trials } of blocks) {
    // From the same flip a kink is read with p, from the other with 1 − p.
    const [same, sameRead] = [(1 - p) * idle, p * read];
    const [other, otherRead] = [p * idle, (1 - p) * read];
    const [a, b] = [same + sameRead, other + otherRead];
    for (let bond = 0; bond < trials; bond++) {
      const [f0, g0, m0, k0] = [f, g, f1, g1];
      f = up * (a * f0 + b * g0);
      g = rate * (b * f0 + a * g0);
      f1 = up * (a * m0 + b * k0 + sameRead * f0 + otherRead * g0);
      g1 = rate * (b * m0 + a * k0 + otherRead * f0 + sameRead * g0);
      const [s0, t0] = [f2, g2];
      f2 = up * (a * s0 + b * t0 + sameRead * (2 * m0 + f0) + otherRead * (2 * k0 + g0));
      g2 = rate * (b * s0 + a * t0 + otherRead * (2 * m0 + f0) + sameRead * (2 * k0 + g0));
      const sum = f + g;
      if (!(sum > 0)) return { log: -Infinity, mean: NaN, variance: NaN };
      if (sum < 1e-100) {
        log += Math.log(sum);
        [f, g, f1, g1, f2, g2] = [f / sum, g / sum, f1 / sum, g1 / sum, f2 / sum, g2 / sum];
      }
    }
  }
  const sum = f + g;
  const mean = (f1 + g1) / sum;
  return { log: log + Math.log(sum), mean, variance: Math.max(0, (f2 + g2) / sum - mean * mean) };
}
