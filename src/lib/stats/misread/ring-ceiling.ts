import type { MisreadCeiling } from './misread-ceiling';
import { ringEven } from './ring-even';
import { ringMoments } from './ring-moments';

/**
 * Largest variance found of the counts of independent kinks on a ring of N bonds whose sites are misread with
 * probability ε, as a function of the mean count as read.
 *
 * Equal bonds reach it, but for a few kinks and ε > 0: then two neighbouring bonds that share all of them vary a little
 * more, by up to 0.3 % at ε = 0.01 and 3 % at 0.09 in rings of 4 to 8 bonds. The larger of both is taken, and mirrored
 * beyond N/2 where N is even. That nothing varies more is not proved, it is what searches say: L-BFGS-B over all p from
 * eight starts at each of up to 22 means found no more in rings of 3 to 9, 11, 16 and 24 bonds at ε = 0.001, 0.01, 0.03,
 * 0.05 and 0.0917, to eight digits, for means up to N/2 and, where N is even, beyond. Not to be used for means beyond N/2
 * where N is odd: there uneven bonds vary up to 1.2 % more at ε = 0.03 and 4.8 % at 0.0917 (7 bonds).
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
