import { spreadLaw } from './spread-law';
import type { TrialLevels } from './trial-levels';
import type { Workspace } from './workspace';

/** Probabilities under 1e-20 of the mode add nothing that a likelihood of observed counts could notice. */
const trim = 1e-20;

/**
 * Σ h_n ln f_n, with ln of the tail sums for lumps and −S ln(1 − f_0) when empty shots were set aside;
 * nats. −Infinity when an observed count is impossible. Leaves the pmf in the workspace.
 *
 * The window is trimmed for speed, and computed whole when an observed count lies near or beyond the trim.
 */
export function logLikelihood(space: Workspace, levels: TrialLevels): number {
  spreadLaw(space, levels, trim);
  const value = score(space, 1e-14);
  if (value > -Infinity) return value;
  spreadLaw(space, levels, 0);
  return score(space, 0);
}

/** −Infinity when an observed count has probability ≤ `least`. */
function score(space: Workspace, least: number): number {
  const { data, f, first, length } = space;
  const { shots } = data;
  const shift = data.first - first;
  let sum = 0;
  for (let i = 0; i < shots.length; i++) {
    const seen = shots[i];
    if (seen === 0) continue;
    const k = i + shift;
    if (k < 0 || k >= length || !(f[k] > least)) return -Infinity;
    sum += seen * Math.log(f[k]);
  }
  if (data.lump) {
    const tail = tailFrom(space, data.lump.from);
    if (!(tail > least)) return -Infinity;
    sum += data.lump.shots * Math.log(tail);
  }
  if (data.below) {
    const head = headTo(space, data.below.to);
    if (!(head > least)) return -Infinity;
    sum += data.below.shots * Math.log(head);
  }
  if (data.withoutEmpty && first === 0) sum -= data.total * Math.log1p(-f[0]);
  return sum;
}

/** P(X ≥ from) of the pmf in the workspace, smallest terms first. */
export function tailFrom(space: Workspace, from: number): number {
  let sum = 0;
  for (let k = space.length - 1; k >= Math.max(0, from - space.first); k--) sum += space.f[k];
  return sum;
}

/** P(X ≤ to) of the pmf in the workspace, smallest terms first. */
export function headTo(space: Workspace, to: number): number {
  let sum = 0;
  const last = Math.min(space.length - 1, to - space.first);
  for (let k = 0; k <= last; k++) sum += space.f[k];
  return sum;
}
