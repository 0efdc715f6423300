import type { Law } from '../types';

/** P(X even) = ½(1 + e^{−2γ} Π(1−2p)^m). */
export function evenProbability(law: Law): number {
  let product = Math.exp(-2 * law.poissonPart);
  for (const { p, trials } of law.levels) product *= (1 - 2 * p) ** trials;
  return (1 + product) / 2;
}
