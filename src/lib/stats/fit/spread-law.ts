import { binomialWindow } from '../laws/binomial-window';
import { poissonWindow } from '../laws/poisson-window';
import type { Window } from '../laws/window';
import type { TrialLevels } from './trial-levels';
import { reserve, type Workspace } from './workspace';

/** Up to this many trials of a level are added one at a time; beyond, their binomial pmf is convolved in. */
const fewTrials = 10;

/**
 * Fills space.f with the pmf of the levels. Ends below `trim` of the largest value are left out.
 *
 * The same sums of positive terms as lawWindow, into buffers that are used again.
 */
export function spreadLaw(space: Workspace, levels: TrialLevels, trim: number): void {
  space.first = levels.ones;
  space.length = 1;
  space.f[0] = 1;
  for (let j = 0; j < levels.p.length; j++) {
    if (levels.trials[j] <= fewTrials) addTrials(space, levels.p[j], levels.trials[j]);
  }
  for (let j = 0; j < levels.p.length; j++) {
    if (levels.trials[j] > fewTrials)
      addWindow(space, binomialWindow(levels.trials[j], levels.p[j], trim, 1), trim);
  }
  if (levels.poissonPart > 0) addWindow(space, poissonWindow(levels.poissonPart, trim, 1), trim);
}

function addTrials(space: Workspace, p: number, trials: number): void {
  reserve(space, space.length + trials);
  const { f } = space;
  const q = 1 - p;
  for (let t = 0; t < trials; t++) {
    const last = space.length++;
    f[last] = f[last - 1] * p;
    for (let n = last - 1; n > 0; n--) f[n] = f[n] * q + f[n - 1] * p;
    f[0] *= q;
  }
}

function addWindow(space: Workspace, window: Window, trim: number): void {
  const { values } = window;
  const length = space.length + values.length - 1;
  reserve(space, length);
  const { f, spare } = space;
  const own = space.length;
  spare.fill(0, 0, length);
  if (own < values.length) {
    for (let k = 0; k < own; k++) {
      const weight = f[k];
      for (let n = 0; n < values.length; n++) spare[n + k] += weight * values[n];
    }
  } else {
    for (let k = 0; k < values.length; k++) {
      const weight = values[k];
      for (let n = 0; n < own; n++) spare[n + k] += weight * f[n];
    }
  }
  let largest = 0;
  for (let n = 0; n < length; n++) if (spare[n] > largest) largest = spare[n];
  const least = trim * largest;
  let start = 0;
  let end = length;
  while (spare[start] <= least) start++;
  while (spare[end - 1] <= least) end--;
  f.set(spare.subarray(start, end));
  space.first += window.first + start;
  space.length = end - start;
}
