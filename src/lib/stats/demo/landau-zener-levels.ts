import type { Level } from '../types';

/**
 * Modes of a ring of L spins after a linear ramp: p_j = exp(−a k_j²), k_j = (2j − 1)π/L, j = 1 … L/2. Each mode
 * is a pair of kinks, present or not, independently of the others.
 *
 * @param sites L, even
 * @param slowness a ≥ 0, proportional to the quench time
 *
 * Source: Dziarmaga 2005, Phys. Rev. Lett. 95:245701 (m).
 */
export function landauZenerLevels(sites: number, slowness: number): Level[] {
  return Array.from({ length: sites / 2 }, (_, j) => {
    const k = ((2 * j + 1) * Math.PI) / sites;
    return { p: Math.exp(-slowness * k * k), trials: 1 };
  });
}
