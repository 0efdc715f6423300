import { cellChange } from './cell-change';
import { information, weigh } from './cell-sums';
import { removeTrial } from './remove-trial';
import type { Slopes } from './slopes';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** Gain of a move of size x: x·slope − ½x²·weight; `touch[j]` couples it to level j, for what follows it. */
export interface Pull {
  slope: number;
  weight: number;
  touch: number[];
}

/** What single trials want, where the levels stand still. */
export interface Pulls {
  /** Of each level: spread of its trials, x = ½Σδ²; null for a single trial. */
  split: (Pull | null)[];
  /** The Poisson part giving up trials, x = ½Σp². */
  poissonSplit: Pull | null;
  /** One trial leaving 0, or 1, by x. */
  leaveZero: Pull | null;
  leaveOne: Pull | null;
}

/**
 * Spreading the trials of a level by δ with Σδ = 0 changes f by −½Σδ² u² f^{(−j−j)}; a trial leaving 0 by x
 * changes it by x·uf; the Poisson part giving trials p for the same mean, by −½Σp² u² f. Each with its
 * first-order gain, its information, and its information shared with the levels. Needs `slope` to be the
 * last that was computed in this workspace.
 */
export function pulls(space: Workspace, levels: TrialLevels, slope: Slopes): Pulls {
  const { change } = space;
  const pull = (f: Float64Array, power: 1 | 2 | -1): Pull => {
    cellChange(space, f, power, change);
    const sign = power === 2 ? -1 : 1;
    const touch: number[] = [];
    for (let j = 0; j < slope.size; j++) {
      touch.push(sign * information(space, change, space.tangents[j]) * (levels.trials[j] ?? 1));
    }
    return { slope: sign * weigh(space, change), weight: information(space, change, change), touch };
  };
  const split = levels.p.map((p, j) => {
    if (levels.trials[j] < 2) return null;
    removeTrial(space.f, space.length, p, space.g);
    removeTrial(space.g, space.length, p, space.gg);
    return pull(space.gg, 2);
  });
  const poisson = levels.poissonPart > 0;
  return {
    split,
    poissonSplit: poisson ? pull(space.f, 2) : null,
    leaveZero: levels.zeros > 0 && !poisson ? pull(space.f, 1) : null,
    leaveOne: levels.ones > 0 ? pull(space.f, -1) : null
  };
}
