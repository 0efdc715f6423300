import type { Law } from '../types';
import { logPmf } from './log-pmf';
import { tilt } from './tilt';

/**
 * Large-deviation rate of a count under a law, sup_θ [θn − Λ(θ)] in nats a shot (divide by N for I(n/N)).
 *
 * @returns ≥ 0; Infinity where the count is impossible. At the ends of the support the supremum is the
 *   limit −ln f_n.
 * Source: Gärtner 1977, Ellis 1984; Chernoff 1952.
 */
export function lawRate(law: Law, count: number): number {
  const tilted = tilt(law, count);
  return tilted ? Math.max(0, -tilted.exponent) : -logPmf(law, count);
}
