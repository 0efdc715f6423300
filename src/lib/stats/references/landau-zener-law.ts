import type { Law } from '../types';

/**
 * Landau–Zener modes: p_j = exp(−a k_j²), k_j = (2j−1)π/(2N), j = 1 … N; the count is the number of excited
 * pairs of a chain of 2N sites quenched through its transition at rate a = 2πJτ.
 *
 * @param modes N, the number of modes and the largest count
 * @param a dimensionless quench time ≥ 0
 * Modes under 1e-290 are written as impossible; were it 1e-30, one shot far out would rule the law out. Source:
 * Landau 1932, Zener 1932; Dziarmaga 2005, Phys. Rev. Lett. 95:245701.
 */
export function landauZenerLaw(modes: number, a: number): Law {
  const levels: Law['levels'] = [];
  let left = modes;
  for (let j = 1; j <= modes; j++) {
    const p = Math.exp(-a * (((2 * j - 1) * Math.PI) / (2 * modes)) ** 2);
    if (p < 1e-290) break;
    levels.push({ p, trials: 1 });
    left--;
  }
  if (left > 0) levels.push({ p: 0, trials: left });
  return { levels, poissonPart: 0 };
}
