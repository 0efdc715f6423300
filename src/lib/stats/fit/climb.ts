import { logLikelihood } from './log-likelihood';
import { newtonStep } from './newton-step';
import { slopes } from './slopes';
import { copyLevels, type TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

const most = 60;
/** Levels and a Poisson part with a smaller sum of probabilities are tried without. */
const little = 1e-3;
/** Steps before a climb may be given up for falling short of its bar. */
const patience = 1;

/** Where a climb ended. */
export interface Climb {
  levels: TrialLevels;
  value: number;
  steps: number;
}

/**
 * Newton's method on the levels with fixed multiplicities, in angles p = sin²φ, γ = ψ², with the exact Hessian; see
 * newtonStep.
 *
 * In angles the ends 0 and 1 are ordinary points: a level that wants to be there arrives quadratically
 * and is absorbed; two levels that want to be one arrive likewise and are merged.
 *
 * @param enough stop when the step in hand promises less than this many nats
 * @param bar give up once two steps have been made and twice the promise of the next does not reach this
 * @param settled log-likelihood that is enough: the climb ends once it is there, short of the maximum
 */
export function climb(
  space: Workspace,
  from: TrialLevels,
  enough: number,
  bar = -Infinity,
  settled = Infinity
): Climb {
  let levels = from;
  let value = logLikelihood(space, levels);
  let buffers = slopes(space, levels);
  let steps = 0;
  for (; steps < most; steps++) {
    const promise = newtonStep(levels, buffers);
    if (!(promise > enough) || (steps >= patience && value + 2 * promise < bar)) break;
    const moved = forward(space, levels, buffers.angles, value);
    if (!moved) break;
    const gain = moved.value - value;
    const { levels: next, value: there } = tidy(space, moved);
    levels = next;
    value = there;
    if (gain < enough / 10 || value >= settled) {
      steps++;
      break;
    }
    buffers = slopes(space, levels);
  }
  return { levels, value, steps };
}

/** A law and its log-likelihood. */
interface Place {
  levels: TrialLevels;
  value: number;
}

/** The longest of step, step/3, step/9 … that gains; null when none does. */
function forward(space: Workspace, levels: TrialLevels, angles: Float64Array, value: number): Place | null {
  for (let share = 1, tries = 0; tries < 12; tries++, share /= 3) {
    const trial = turned(levels, angles, share);
    const there = logLikelihood(space, trial);
    if (there > value) return { levels: trial, value: there };
  }
  return null;
}

function turned(levels: TrialLevels, angles: Float64Array, share: number): TrialLevels {
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
function tidy(space: Workspace, moved: Place): Place {
  return isTidy(moved.levels) ? moved : tidied(space, moved);
}

/** No level is near an end or another: as after nearly every step. */
function isTidy({ p, trials, poissonPart }: TrialLevels): boolean {
  if (poissonPart > 0 && poissonPart < little) return false;
  for (let j = 0; j < p.length; j++) {
    if (p[j] * trials[j] < little || (1 - p[j]) * trials[j] < little) return false;
    for (let k = 0; k < j; k++) if (near(p[k], p[j])) return false;
  }
  return true;
}

function tidied(space: Workspace, { levels, value }: Place): Place {
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
    if (p[j] * trials[j] < little) attempt(absorbed(best.levels, j, 'zeros'));
    else if ((1 - p[j]) * trials[j] < little) attempt(absorbed(best.levels, j, 'ones'));
  }
  // Quadratic arrival stops at about 1e-11, which a report should not show as a Poisson part.
  if (levels.poissonPart > 0 && levels.poissonPart < little) attempt(withoutPoisson(best.levels));
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

function withoutPoisson(levels: TrialLevels): TrialLevels {
  const out = copyLevels(levels);
  out.poissonPart = 0;
  return out;
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
