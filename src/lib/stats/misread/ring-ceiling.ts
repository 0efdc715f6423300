import type { MisreadCeiling } from './misread-ceiling';
import { ringEven } from './ring-even';
import { ringMoments } from './ring-moments';

/**
 * Largest variance found of the counts of independent kinks on a ring of N bonds whose sites are misread with
 * probability ε, as a function of the mean count as read.
 *
 * Equal bonds reach it, but for a few kinks and ε > 0: then two neighbouring bonds that share all of them vary a little
 * more, by up to 0.3 % at ε = 0.01 and 3 % at 0.09 in rings of 4 to 8 bonds. The larger of both is taken. This is not
 * proved: searches over unequal p in rings of 3 to 8 bonds found nothing above it at ε = 0 and, for means up to N/2, at
 * ε = 0.01, and 0.4 % more at ε = 0.09; beyond N/2 in rings of an odd number of bonds 0.3 % and 3.4 % more.
 *
 * @param bonds N ≥ 3
 * @param rate ε, (1 − 2ε)² ≥ 2/3
 * @returns a function of the mean, both in single kinks; a mean that no kinks can give is moved to the nearest
 */
export function ringCeiling(bonds: number, rate: number): (mean: number) => MisreadCeiling {
  const square = (1 - 2 * rate) ** 2;
  const lost = 4 * rate * (1 - rate);
  return (mean) => {
    const p = ringEven(bonds, mean, rate);
    const { variance } = ringMoments(bonds, p, rate);
    // All bonds the other way round give N − n, which is even where N is.
    const mirrored = bonds % 2 === 0 && mean > bonds / 2;
    const share = ((mirrored ? bonds - mean : mean) - (bonds * lost) / 2) / (2 * square);
    if (share > 0 && share < 1) {
      const two =
        square * square * 4 * share * (1 - share) +
        (bonds * lost * (1 + square)) / 4 +
        (square * lost * (bonds - 4 * share)) / 2;
      if (two > variance) {
        const rest = mirrored ? 1 : 0;
        // Both bonds or none: p²/(p² + (1 − p)²) = share.
        const odds = Math.sqrt(share / (1 - share));
        const pair = mirrored ? 1 / (1 + odds) : odds / (1 + odds);
        return {
          variance: two,
          kinks: Float64Array.from({ length: bonds }, (_, k) => (k < 2 ? pair : rest))
        };
      }
    }
    return { variance, kinks: new Float64Array(bonds).fill(p) };
  };
}
