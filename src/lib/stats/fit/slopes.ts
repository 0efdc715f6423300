import { cellWeights } from './cell-weights';
import { removeTrial } from './remove-trial';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** Gain of a move of size x: x·slope − ½x²·weight; `touch[j]` couples it to level j, for what follows it. */
export interface Pull {
  slope: number;
  weight: number;
  touch: Float64Array;
}

/** First and second derivatives of the log-likelihood, and what single trials want. */
export interface Slopes {
  /** ∂L/∂p_j of each level (all its trials moved together), then ∂L/∂γ when there is a Poisson part. */
  gradient: Float64Array;
  /** Second derivatives, row by row, in the same order. */
  hessian: Float64Array;
  /** Fisher-like part: −Σ ∂²L/∂f² ∂f/∂p_j ∂f/∂p_k, positive semidefinite. */
  fisher: Float64Array;
  size: number;
  /** Of each level: spread of its trials, x = ½Σδ². */
  split: (Pull | null)[];
  /** The Poisson part giving up trials, x = ½Σp². */
  poissonSplit: Pull | null;
  /** One trial leaving 0, or 1, by x. */
  leaveZero: Pull | null;
  leaveOne: Pull | null;
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
  const gradient = new Float64Array(size);
  const hessian = new Float64Array(size * size);
  const fisher = new Float64Array(size * size);
  const bend = new Float64Array(size);
  const doubled = new Float64Array(size);
  const tangents: Float64Array[] = [];
  const spreads: (Float64Array | null)[] = [];
  const plain = cellChange(space, space.f, 1);
  for (let j = 0; j < count; j++) {
    const p = levels.p[j];
    removeTrial(space.f, space.length, p, space.g);
    const tangent = cellChange(space, space.g, 1);
    tangents.push(tangent);
    gradient[j] = levels.trials[j] * weigh(space, tangent);
    bend[j] = weigh(space, cellChange(space, space.g, 2));
    spreads.push(null);
    if (levels.trials[j] > 1) {
      removeTrial(space.g, space.length, p, space.gg);
      spreads[j] = cellChange(space, space.gg, 2);
      doubled[j] = weigh(space, spreads[j]!);
    }
  }
  const twice = levels.poissonPart > 0 ? cellChange(space, space.f, 2) : null;
  if (twice) {
    tangents.push(plain);
    gradient[count] = weigh(space, plain);
    bend[count] = weigh(space, twice);
  }
  for (let j = 0; j < size; j++) {
    const m = j < count ? levels.trials[j] : 1;
    for (let k = 0; k <= j; k++) {
      const both = m * (k < count ? levels.trials[k] : 1);
      let second: number;
      if (j === k) second = j < count ? m * (m - 1) * doubled[j] : bend[j];
      else if (j === count) second = both * bend[k];
      else second = both * without(levels.p[j], bend[j], levels.p[k], bend[k]);
      const information = both * information2(space, tangents[j], tangents[k]);
      fisher[j * size + k] = fisher[k * size + j] = information;
      hessian[j * size + k] = hessian[k * size + j] = second - information;
    }
  }
  const pull = (change: Float64Array): Pull => ({
    slope: weigh(space, change),
    weight: information2(space, change, change),
    touch: Float64Array.from(
      tangents,
      (tangent, j) => information2(space, change, tangent) * (levels.trials[j] ?? 1)
    )
  });
  return {
    gradient,
    hessian,
    fisher,
    size,
    split: spreads.map((spread) => (spread ? pull(spread.map((value) => -value)) : null)),
    poissonSplit: twice ? pull(twice.map((value) => -value)) : null,
    leaveZero: levels.zeros > 0 && !twice ? pull(plain) : null,
    leaveOne: levels.ones > 0 ? pull(cellChange(space, space.f, -1)) : null
  };
}

/** Σ w u² f^{(−j−k)} for p ≠ q; levels nearer than 1e-5 are merged long before. */
function without(p: number, bendP: number, q: number, bendQ: number): number {
  const apart = Math.abs(p - q) < 1e-5 ? 1e-5 : p - q;
  return (p * bendP - q * bendQ) / apart;
}

/**
 * Change of each cell's probability: (uf)_n for power 1, (u²f)_n for 2, and for −1 what a sure trial
 * leaving 1 does, f_{n+1} − f_n. Entries: data.shots cells, then the lump, then n = 0 if set aside.
 */
function cellChange(space: Workspace, f: Float64Array, power: 1 | 2 | -1): Float64Array {
  const { data, length } = space;
  const cells = data.shots.length;
  const out = new Float64Array(cells + 2);
  const shift = data.first - space.first;
  const at = (k: number) => (k >= 0 && k < length ? f[k] : 0);
  for (let i = 0; i < cells; i++) {
    if (data.shots[i] === 0) continue;
    const k = i + shift;
    if (power === 1) out[i] = (k > 0 ? f[k - 1] : 0) - f[k];
    else if (power === 2) out[i] = (k > 1 ? f[k - 2] : 0) - 2 * (k > 0 ? f[k - 1] : 0) + f[k];
    else out[i] = at(k + 1) - f[k];
  }
  // Sums from a count on telescope: Σ_{k≥c} (uf)_k = f_{c−1}, Σ (u²f)_k = f_{c−2} − f_{c−1}.
  if (data.lump) {
    const c = data.lump.from - space.first;
    out[cells] = power === 1 ? at(c - 1) : power === 2 ? at(c - 2) - at(c - 1) : -at(c);
  }
  if (space.emptySingle !== 0) out[cells + 1] = power === -1 ? at(1) - f[0] : power === 1 ? -f[0] : f[0];
  return out;
}

/** Σ_cells ∂L/∂f · change. */
function weigh(space: Workspace, change: Float64Array): number {
  const { single } = space;
  let sum = 0;
  for (let i = 0; i < single.length; i++) sum += single[i] * change[i];
  return sum + space.lumpSingle * change[single.length] + space.emptySingle * change[single.length + 1];
}

/** −Σ_cells ∂²L/∂f² · a · b. */
function information2(space: Workspace, a: Float64Array, b: Float64Array): number {
  const { double } = space;
  const cells = double.length;
  let sum = 0;
  for (let i = 0; i < cells; i++) sum += double[i] * a[i] * b[i];
  return sum + space.lumpDouble * a[cells] * b[cells] + space.emptyDouble * a[cells + 1] * b[cells + 1];
}
