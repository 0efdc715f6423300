import type { Effect, Sharpness } from '../planning/effect';

/** A plan of the grid: an effect, and how sharply it is to be seen. */
export interface GridPlan extends Sharpness {
  effect: Effect;
}

const SHARPNESS: Sharpness[] = [
  { alpha: 0.05, power: 0.8 },
  { alpha: 0.01, power: 0.9 },
  { alpha: 0.05, power: 0.5 },
  { alpha: 0.001, power: 0.8 }
];

/**
 * Plans that the power planner is held to: N = 10 … 200 and unknown, means from 2 % to half of N, every kind of effect
 * small and large, at four sharpnesses; some effects cannot be, and have no plan.
 */
export function planGrid(): GridPlan[] {
  const effects: Effect[] = [];
  for (const trials of [10, 24, 64, 200, null])
    for (const p of [0.02, 0.1, 0.3, 0.5]) {
      const mean = p * (trials ?? 20);
      for (const size of [0.05, 0.15, 0.5]) effects.push({ kind: 'excess', size, mean, trials });
      if (trials === null) continue;
      for (const x of [0.1, 0.4]) effects.push({ kind: 'pairs', size: x / (trials - 1), mean, trials });
      for (const size of [0.05, 0.2]) effects.push({ kind: 'neighbours', size, mean, trials });
      for (const size of [0.003, 0.02]) effects.push({ kind: 'misread', size, mean, trials });
    }
  return SHARPNESS.flatMap((sharp) => effects.map((effect) => ({ effect, ...sharp })));
}
