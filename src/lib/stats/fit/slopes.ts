import { information } from './cell-sums';
import { cellWeights } from './cell-weights';
import { levelRemoval } from './level-removal';
import { stepBuffers, type StepBuffers } from './step-buffers';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** First and second derivatives of the log-likelihood in the levels, in buffers that the next call overwrites. */
export interface Slopes {
  /** ∂L/∂p_j of each level (all its trials moved together), then ∂L/∂γ when there is a Poisson part. */
  gradient: Float64Array;
  /** Second derivatives, row by row, in the same order. */
  hessian: Float64Array;
  /** Fisher-like part: −Σ ∂²L/∂f² ∂f/∂p_j ∂f/∂p_k, positive semidefinite. */
  fisher: Float64Array;
  size: number;
}

/**
 * With u = z − 1, moving a trial of probability p by δ multiplies G by 1 + δu/(1+pu): so
 * ∂f/∂p_j = m_j u f^{(−j)}, ∂²f/∂p_j∂p_k = m_j m_k u² f^{(−j−k)}, m_j(m_j−1) u² f^{(−j−j)}, where (uf)_n =
 * f_{n−1} − f_n and f^{(−j)} is the pmf without one trial of level j. For p_j ≠ p_k partial fractions give
 * f^{(−j−k)} = (p_j f^{(−j)} − p_k f^{(−k)})/(p_j − p_k), so only J single and J double removals are made.
 *
 * Needs the pmf of `levels` in the workspace; leaves the change of each cell with p_j of one trial, γ last, in
 * space.tangents.
 */
export function slopes(space: Workspace, levels: TrialLevels): Slopes & StepBuffers {
  cellWeights(space);
  const count = levels.p.length;
  const size = count + (levels.poissonPart > 0 ? 1 : 0);
  const buffers = stepBuffers(space.sized, size);
  const { gradient, hessian, fisher, bend, doubled } = buffers;
  const { sums, tangents } = space;
  if (tangents.length < size) moreTangents(space, size);
  for (let j = 0; j < count; j++) {
    levelRemoval(space, levels.p[j], levels.trials[j] > 1, sums);
    bend[j] = sums.single;
    doubled[j] = sums.double;
    gradient[j] = levels.trials[j] * tangent(space, space.g, tangents[j]);
  }
  if (size > count) {
    gradient[count] = tangent(space, space.f, tangents[count]);
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
  return buffers;
}

function moreTangents(space: Workspace, size: number): void {
  while (space.tangents.length < size) space.tangents.push(new Float64Array(space.change.length));
}

/** The change of each cell with one trial, cellChange with power 1, and what it adds to L, in one pass. */
function tangent(space: Workspace, f: Float64Array, out: Float64Array): number {
  const { data, single, length } = space;
  const cells = data.shots.length;
  const shift = data.first - space.first;
  const from = Math.min(cells, Math.max(0, -shift));
  const to = Math.max(from, Math.min(cells, length - shift));
  for (let i = 0; i < from; i++) out[i] = 0;
  for (let i = to; i < cells + 3; i++) out[i] = 0;
  let sum = 0;
  let before = at(f, from + shift - 1, length);
  for (let i = from; i < to; i++) {
    const here = f[i + shift];
    const change = before - here;
    out[i] = change;
    sum += single[i] * change;
    before = here;
  }
  if (data.lump) {
    out[cells] = at(f, data.lump.from - space.first - 1, length);
    sum += space.lumpSingle * out[cells];
  }
  if (data.below) {
    out[cells + 2] = -at(f, data.below.to - space.first, length);
    sum += space.belowSingle * out[cells + 2];
  }
  if (space.emptySingle !== 0) {
    out[cells + 1] = -at(f, -space.first, length);
    sum += space.emptySingle * out[cells + 1];
  }
  return sum;
}

function at(f: Float64Array, n: number, length: number): number {
  return n >= 0 && n < length ? f[n] : 0;
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
