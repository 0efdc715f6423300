import type { Level } from '../types';

/**
 * Mean and variance of the kinks read along an open chain with misread sites (see chainWindow), in closed form:
 * with m_k = 1 − 2p_k and u = 1 − 2ε, mean = ½ Σ(1 − m_k u²) and
 * variance = ¼[Σ(1 − m_k² u⁴) + 2 Σ m_k m_{k+1} u²(1 − u²)]. Relative error about 1e-15.
 *
 * @param blocks kink probabilities in the order of the bonds, as blocks of equal p
 * @param rate ε of one site
 *
 * A bond reads (−1)^{kink}·(flips of its two sites); neighbouring bonds share one flip, whose square is 1, and hence
 * the covariance ¼ m_k m_{k+1} u²(1 − u²).
 */
export function chainMoments(blocks: readonly Level[], rate: number): { mean: number; variance: number } {
  // 1 − u⁴ and the like from ε itself: 1 − (1 − 2ε)² would lose the digits of a small ε.
  const lost = 4 * rate * (1 - rate);
  const square = 1 - lost;
  const toggled = lost / 2;
  let mean = 0;
  let own = 0;
  let shared = 0;
  let before: number | null = null;
  for (const { p, trials } of blocks) {
    if (trials === 0) continue;
    const m = 1 - 2 * p;
    const read = p + toggled * m;
    mean += trials * read;
    own += trials * read * (1 - read);
    shared += (trials - 1) * m * m + (before === null ? 0 : before * m);
    before = m;
  }
  return { mean, variance: own + (shared * square * lost) / 2 };
}
