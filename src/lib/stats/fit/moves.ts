import { solveSymmetric } from '../numerics/solve-symmetric';
import { logLikelihood } from './log-likelihood';
import { pulls, type Pull } from './pulls';
import { slopes, type Slopes } from './slopes';
import { copyLevels, type TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** A change of structure that the slopes promise to pay, and the levels to climb from. */
export interface Move {
  promise: number;
  starts: TrialLevels[];
}

/**
 * Structural moves from a point where all levels stand still: a trial leaves 0 or 1, a level splits, the
 * Poisson part gives up trials. Sorted by the gain promised once the other levels have followed.
 *
 * These four are all that first- and second-order changes of single trials can do; where none pays, the
 * point is a local maximum among all N probabilities, and no move of two trials improves it (the
 * likelihood is concave in the sum and the product of any pair).
 */
export function moves(space: Workspace, levels: TrialLevels, worth: number): Move[] {
  const out: Move[] = [];
  logLikelihood(space, levels);
  const slope = slopes(space, levels);
  const wants = pulls(space, levels, slope);
  const add = (pull: Pull | null, make: (size: number) => TrialLevels[]) => {
    if (!pull || !(pull.slope > 0)) return;
    const weight = afterOthersFollow(pull, slope);
    const promise = pull.slope ** 2 / (2 * weight);
    if (promise > worth) out.push({ promise, starts: make(pull.slope / weight) });
  };
  add(wants.leaveZero, (x) => leave(levels, x, 'zeros'));
  add(wants.leaveOne, (x) => leave(levels, x, 'ones'));
  wants.split.forEach((pull, j) => add(pull, (x) => split(levels, j, 2 * x)));
  add(wants.poissonSplit, (x) => harden(levels, 2 * x));
  return out.sort((a, b) => b.promise - a.promise);
}

/**
 * Curvature along the move once the levels have moved to where they then want to be: weight minus its
 * projection on their tangents, in the Fisher metric. Much of a move is undone by them, so the plain
 * weight promises ten times too little.
 */
function afterOthersFollow(pull: Pull, slope: Slopes): number {
  const follow = solveSymmetric(slope.fisher, slope.size, pull.touch);
  let weight = pull.weight;
  for (let j = 0; j < slope.size; j++) weight -= follow[j] * pull.touch[j];
  return Math.max(weight, 1e-4 * pull.weight, 1e-300);
}

function leave(levels: TrialLevels, total: number, from: 'zeros' | 'ones'): TrialLevels[] {
  const available = Math.min(levels[from], 1e6);
  const sizes = available > 3 ? [1, Math.ceil(Math.sqrt(available)), available] : [1];
  return sizes.map((size) => {
    const out = copyLevels(levels);
    const shift = Math.min(0.3, Math.max(1e-6, total / size));
    out[from] -= size;
    out.p.push(from === 'zeros' ? shift : 1 - shift);
    out.trials.push(size);
    return out;
  });
}

/** Parts of a level with Σδ² = spread and Σδ = 0: one up, halves, one down. */
function split(levels: TrialLevels, j: number, spread: number): TrialLevels[] {
  const trials = levels.trials[j];
  const sizes = trials === 2 ? [1] : trials === 3 ? [1, 2] : [1, trials >> 1, trials - 1];
  return sizes.map((size) => {
    const rest = trials - size;
    const up = Math.sqrt((spread * rest) / (size * trials));
    const down = Math.sqrt((spread * size) / (rest * trials));
    const room = Math.min(1, (0.7 * (1 - levels.p[j])) / up, (0.7 * levels.p[j]) / down);
    const out = copyLevels(levels);
    out.p[j] += up * room;
    out.trials[j] = size;
    out.p.push(levels.p[j] - down * room);
    out.trials.push(rest);
    return out;
  });
}

/** The Poisson part gives `size` trials of probability p, Σp² = spread: one, or several alike. */
function harden(levels: TrialLevels, spread: number): TrialLevels[] {
  return [1, 4, 16].map((size) => {
    const out = copyLevels(levels);
    const p = Math.min(Math.sqrt(spread / size), 0.7, (0.7 * levels.poissonPart) / size);
    out.poissonPart -= size * p;
    out.p.push(p);
    out.trials.push(size);
    return out;
  });
}
