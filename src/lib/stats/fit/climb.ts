import { solvePositive } from '../numerics/solve-positive';
import { symmetricEigen } from '../numerics/symmetric-eigen';
import { logLikelihood } from './log-likelihood';
import { slopes, type Slopes } from './slopes';
import { copyLevels, type TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

const most = 60;
/** Steps before a climb may be given up for falling short of its bar. */
const patience = 1;

/** Whether a log-likelihood is as much as anyone needs to know: a search may end there, short of the maximum. */
export type Settled = (value: number) => boolean;
export const neverSettled: Settled = () => false;

/** Where a climb ended. */
export interface Climb {
  levels: TrialLevels;
  value: number;
  steps: number;
}

/** No angle moves further than this in a step: beyond, the quadratic picture of the likelihood is no guide. */
const longest = 0.35;

/**
 * Newton's method on the levels with fixed multiplicities, in angles p = sin²φ, γ = ψ², with the exact
 * Hessian and its eigenvalues taken by size, so that saddles repel (Dauphin et al. 2014).
 *
 * In angles the ends 0 and 1 are ordinary points: a level that wants to be there arrives quadratically
 * and is absorbed; two levels that want to be one arrive likewise and are merged.
 *
 * @param enough stop when the step in hand promises less than this many nats
 * @param bar give up once two steps have been made and twice the promise of the next does not reach this
 * @param settled ends the climb where it says so
 */
export function climb(
  space: Workspace,
  from: TrialLevels,
  enough: number,
  bar = -Infinity,
  settled = neverSettled
): Climb {
  let levels = from;
  let value = logLikelihood(space, levels);
  let slope = slopes(space, levels);
  let steps = 0;
  for (; steps < most; steps++) {
    const step = newtonStep(levels, slope);
    if (!(step.promise > enough) || (steps >= patience && value + 2 * step.promise < bar)) break;
    const moved = forward(space, levels, step.angles, value);
    if (!moved) break;
    const gain = moved.value - value;
    ({ levels, value } = tidy(space, moved.levels, moved.value));
    if (gain < enough / 10 || settled(value)) {
      steps++;
      break;
    }
    slope = slopes(space, levels);
  }
  return { levels, value, steps };
}

/** The longest of step, step/3, step/9 … that gains; null when none does. */
function forward(space: Workspace, levels: TrialLevels, angles: number[], value: number) {
  for (let share = 1, tries = 0; tries < 12; tries++, share /= 3) {
    const trial = turned(levels, angles, share);
    const there = logLikelihood(space, trial);
    if (there > value) return { levels: trial, value: there };
  }
  return null;
}

function newtonStep(levels: TrialLevels, slope: Slopes): { angles: number[]; promise: number } {
  const { size, gradient, hessian } = slope;
  const count = levels.p.length;
  const first = new Array<number>(size);
  const second = new Array<number>(size);
  for (let j = 0; j < size; j++) {
    // p = sin²φ: dp/dφ = 2√(p(1−p)), d²p/dφ² = 2(1−2p); γ = ψ²: 2√γ and 2.
    first[j] = j < count ? 2 * Math.sqrt(levels.p[j] * (1 - levels.p[j])) : 2 * Math.sqrt(levels.poissonPart);
    second[j] = j < count ? 2 * (1 - 2 * levels.p[j]) : 2;
  }
  const g = new Array<number>(size);
  for (let j = 0; j < size; j++) g[j] = gradient[j] * first[j];
  const h = new Array<number>(size * size);
  for (let j = 0; j < size; j++) {
    for (let k = 0; k < size; k++) h[j * size + k] = -hessian[j * size + k] * first[j] * first[k];
    h[j * size + j] -= gradient[j] * second[j];
  }
  return steepest(h, g, size);
}

/** −H⁻¹g where H is negative definite and the step short; else along its eigenvectors, each kept short. */
function steepest(h: number[], g: number[], size: number): { angles: number[]; promise: number } {
  const newton = solvePositive(h, size, g);
  if (newton && short(newton)) {
    let promise = 0;
    for (let j = 0; j < size; j++) promise += 0.5 * newton[j] * g[j];
    return { angles: newton, promise };
  }
  const { values, vectors } = symmetricEigen(h, size);
  let stiffest = 0;
  for (const value of values) stiffest = Math.max(stiffest, Math.abs(value));
  const angles = new Array<number>(size).fill(0);
  let promise = 0;
  for (let k = 0; k < size; k++) {
    let along = 0;
    for (let j = 0; j < size; j++) along += vectors[j * size + k] * g[j];
    let length = along / Math.max(Math.abs(values[k]), 1e-9 * stiffest, 1e-300);
    length = Math.max(-longest, Math.min(longest, length));
    promise += along * length * (values[k] > 0 ? 0.5 : 1);
    for (let j = 0; j < size; j++) angles[j] += vectors[j * size + k] * length;
  }
  return { angles, promise };
}

function short(angles: number[]): boolean {
  for (const angle of angles) if (!(Math.abs(angle) < longest)) return false;
  return true;
}

function turned(levels: TrialLevels, angles: number[], share: number): TrialLevels {
  const out = copyLevels(levels);
  for (let j = 0; j < out.p.length; j++) {
    // sin(φ + δ) = √p cos δ + √(1−p) sin δ, with cos and sin of 2 arctan(δ/2), which is δ to third order: browsers and
    // Node differ in the last digit of Math.sin, and the document must not.
    const half = (share * angles[j]) / 2;
    const root =
      (Math.sqrt(out.p[j]) * (1 - half * half) + Math.sqrt(1 - out.p[j]) * 2 * half) / (1 + half * half);
    out.p[j] = root * root;
  }
  if (levels.poissonPart > 0) {
    // A step across zero would bounce: half-way there instead.
    const root = Math.sqrt(levels.poissonPart);
    out.poissonPart = Math.max(root / 2, root + share * angles[out.p.length]) ** 2;
  }
  return out;
}

/** Absorbs levels that have come to 0 or 1 and merges levels that have met, where that costs nothing. */
function tidy(space: Workspace, levels: TrialLevels, value: number): { levels: TrialLevels; value: number } {
  let best = { levels, value };
  let stale = false;
  const attempt = (trial: TrialLevels) => {
    const there = logLikelihood(space, trial);
    stale = there < best.value - 1e-9;
    if (stale) return false;
    best = { levels: trial, value: there };
    return true;
  };
  for (let j = levels.p.length - 1; j >= 0; j--) {
    const { p, trials } = best.levels;
    if (p[j] * trials[j] < 1e-3) attempt(absorbed(best.levels, j, 'zeros'));
    else if ((1 - p[j]) * trials[j] < 1e-3) attempt(absorbed(best.levels, j, 'ones'));
  }
  // Quadratic arrival stops at about 1e-11, which a report should not show as a Poisson part.
  if (levels.poissonPart > 0 && levels.poissonPart < 1e-3) attempt({ ...best.levels, poissonPart: 0 });
  for (let j = 0; j < best.levels.p.length; j++) {
    for (let k = best.levels.p.length - 1; k > j; k--) {
      if (near(best.levels.p[j], best.levels.p[k])) attempt(merged(best.levels, j, k));
    }
  }
  // The workspace must hold the pmf of what is returned.
  if (stale) logLikelihood(space, best.levels);
  return best;
}

/** Angles within 0.02 of each other, by the sine of their difference. */
function near(p: number, q: number): boolean {
  return Math.abs(p - q) < 0.05 && Math.abs(Math.sqrt(p * (1 - q)) - Math.sqrt(q * (1 - p))) < 0.02;
}

function absorbed(levels: TrialLevels, j: number, into: 'zeros' | 'ones'): TrialLevels {
  const out = copyLevels(levels);
  if (into === 'zeros' && out.poissonPart > 0) out.poissonPart += out.p[j] * out.trials[j];
  out[into] += out.trials[j];
  out.p.splice(j, 1);
  out.trials.splice(j, 1);
  return out;
}

function merged(levels: TrialLevels, j: number, k: number): TrialLevels {
  const out = copyLevels(levels);
  const trials = out.trials[j] + out.trials[k];
  out.p[j] = (out.p[j] * out.trials[j] + out.p[k] * out.trials[k]) / trials;
  out.trials[j] = trials;
  out.p.splice(k, 1);
  out.trials.splice(k, 1);
  return out;
}
