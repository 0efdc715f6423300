import { repeatsFor } from '../planning/repeats-for';
import { shotsToSee } from '../planning/shots-to-see';
import { simulatePower } from '../planning/simulate-power';
import type { GridPlan } from './plan-grid';

/** A plan beside the power that it has on invented shots. */
export interface TriedPlan {
  shots: number;
  /** Simulated power less the planned one. */
  off: number;
  /** Limits of that, 95 %, the cut's own uncertainty in them. */
  low: number;
  high: number;
}

/**
 * Makes one plan and tries it out.
 *
 * @returns why not, where there is no plan, its formula says that it is rough, or it takes more than `most` shots
 */
export function tryPlan(
  { effect, alpha, power }: GridPlan,
  seed: number,
  most = 3e6
): TriedPlan | 'none' | 'rough' | 'large' {
  const found = shotsToSee(effect, { alpha, power });
  const repeats = repeatsFor(alpha);
  if (!found?.shots || !repeats) return 'none';
  if (found.rough) return 'rough';
  if (found.shots > most) return 'large';
  const { share, low, high } = simulatePower(effect, found.shots, alpha, repeats, seed)!;
  return {
    shots: found.shots,
    off: share - found.power,
    low: low - found.power,
    high: high - found.power
  };
}
