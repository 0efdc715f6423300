import { headTo, tailFrom } from './log-likelihood';
import type { Workspace } from './workspace';

/** Fills the workspace's ∂L/∂f and −∂²L/∂f² of each cell for the pmf it holds. */
export function cellWeights(space: Workspace): void {
  const { data, f, single, double } = space;
  const { shots } = data;
  const shift = data.first - space.first;
  for (let i = 0; i < shots.length; i++) {
    if (shots[i] === 0) continue;
    const over = 1 / f[i + shift];
    single[i] = shots[i] * over;
    double[i] = single[i] * over;
  }
  space.lumpSingle = space.lumpDouble = space.belowSingle = space.belowDouble = 0;
  space.emptySingle = space.emptyDouble = 0;
  if (data.lump) {
    const tail = tailFrom(space, data.lump.from);
    space.lumpSingle = data.lump.shots / tail;
    space.lumpDouble = space.lumpSingle / tail;
  }
  if (data.below) {
    const head = headTo(space, data.below.to);
    space.belowSingle = data.below.shots / head;
    space.belowDouble = space.belowSingle / head;
  }
  // With one sure trial no shot is empty, but some are once it leaves.
  if (data.withoutEmpty && space.first <= 1) {
    // −S ln(1 − f_0) is convex in f_0, hence the sign of its second derivative.
    const some = space.first === 0 ? 1 - f[0] : 1;
    space.emptySingle = data.total / some;
    space.emptyDouble = -space.emptySingle / some;
  }
  bend(space);
}

/** Lays ∂L/∂f out over the window and two counts beyond, then differences it in place. */
function bend(space: Workspace): void {
  const { data, bent, single, length } = space;
  bent.fill(0, 0, length + 2);
  const shift = data.first - space.first;
  const cells = data.shots.length;
  for (let i = Math.max(0, -shift); i < cells && i + shift < length + 2; i++) bent[i + shift] = single[i];
  if (data.lump) {
    for (let k = Math.max(0, data.lump.from - space.first); k < length + 2; k++) bent[k] += space.lumpSingle;
  }
  if (data.below) {
    for (let k = Math.min(length + 1, data.below.to - space.first); k >= 0; k--) bent[k] += space.belowSingle;
  }
  if (space.first === 0) bent[0] += space.emptySingle;
  for (let k = 0; k < length; k++) bent[k] += bent[k + 2] - 2 * bent[k + 1];
}
