import { cellChange } from './cell-change';
import { information, weigh } from './cell-sums';
import { cellWeights } from './cell-weights';
import { levelRemoval, type RemovalSums } from './level-removal';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** First and second derivatives of the log-likelihood in the levels. */
export interface Slopes {
  /** ∂L/∂p_j of each level (all its trials moved together), then ∂L/∂γ when there is a Poisson part. */
  gradient: number[];
  /** Second derivatives, row by row, in the same order. */
  hessian: number[];
  /** Fisher-like part: −Σ ∂²L/∂f² ∂f/∂p_j ∂f/∂p_k, positive semidefinite. */
  fisher: number[];
  size: number;
  /** Change of each cell with p_j of one trial, with γ last; in buffers that the next call overwrites. */
  tangents: Float64Array[];
}

/**
 * With u = z − 1, moving a trial of probability p by δ multiplies G by 1 + δu/(1+pu): so
 * ∂f/∂p_j = m_j u f^{(−j)}, ∂²f/∂p_j∂p_k = m_j m_k u² f^{(−j−k)}, m_j(m_j−1) u² f^{(−j−j)}, where (uf)_n =
 * f_{n−1} − f_n and f^{(−j)} is the pmf without one trial of level j. For p_j ≠ p_k partial fractions give
 * f^{(−j−k)} = (p_j f^{(−j)} − p_k f^{(−k)})/(p_j − p_k), so only J single and J double removals are made.
 *
 * Needs the pmf of `levels` in the workspace.
 */
export function slopes(space: Workspace, levels: TrialLevels): Slopes {
  cellWeights(space);
  const count = levels.p.length;
  const size = count + (levels.poissonPart > 0 ? 1 : 0);
  const gradient = new Array<number>(size).fill(0);
  const hessian = new Array<number>(size * size).fill(0);
  const fisher = new Array<number>(size * size).fill(0);
  const bend = new Array<number>(size).fill(0);
  const doubled = new Array<number>(size).fill(0);
  const sums: RemovalSums = { single: 0, double: 0 };
  const tangents = tangentBuffers(space, size);
  for (let j = 0; j < count; j++) {
    levelRemoval(space, levels.p[j], levels.trials[j] > 1, sums);
    bend[j] = sums.single;
    doubled[j] = sums.double;
    cellChange(space, space.g, 1, tangents[j]);
    gradient[j] = levels.trials[j] * weigh(space, tangents[j]);
  }
  if (size > count) {
    cellChange(space, space.f, 1, tangents[count]);
    gradient[count] = weigh(space, tangents[count]);
    bend[count] = bentSum(space, space.f);
  }
  for (let j = 0; j < size; j++) {
    const m = j < count ? levels.trials[j] : 1;
    for (let k = 0; k <= j; k++) {
      const both = m * (k < count ? levels.trials[k] : 1);
      let second: number;
      if (j === k) second = j < count ? m * (m - 1) * doubled[j] : bend[j];
      else if (j === count) second = both * bend[k];
      else second = both * without(levels.p[j], bend[j], levels.p[k], bend[k]);
      const shared = both * information(space, tangents[j], tangents[k]);
      fisher[j * size + k] = fisher[k * size + j] = shared;
      hessian[j * size + k] = hessian[k * size + j] = second - shared;
    }
  }
  return { gradient, hessian, fisher, size, tangents };
}

/** One buffer a level, kept in the workspace: arrays of this size are what the garbage collector dreads. */
function tangentBuffers(space: Workspace, size: number): Float64Array[] {
  while (space.tangents.length < size) space.tangents.push(new Float64Array(space.change.length));
  return space.tangents;
}

/** Σ w u² f^{(−j−k)} for p ≠ q; levels nearer than 1e-5 are merged long before. */
function without(p: number, bendP: number, q: number, bendQ: number): number {
  const apart = Math.abs(p - q) < 1e-5 ? 1e-5 : p - q;
  return (p * bendP - q * bendQ) / apart;
}

/** Σ w (u²g) over the cells, by the adjoint: w is differenced once, not each g. */
function bentSum(space: Workspace, g: Float64Array): number {
  const { bent, length } = space;
  let sum = 0;
  for (let k = 0; k < length; k++) sum += bent[k] * g[k];
  return sum;
}
