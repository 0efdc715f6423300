import { binomialInto } from './binomial-into';
import { poissonInto } from './poisson-into';
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
    if (levels.trials[j] <= fewTrials) continue;
    const [first, length] = binomialInto(space, levels.trials[j], levels.p[j], trim);
    addPart(space, first, length, trim);
  }
  if (levels.poissonPart > 0) {
    const [first, length] = poissonInto(space, levels.poissonPart, trim);
    addPart(space, first, length, trim);
  }
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

/** Convolves space.part (`count` values from `from`) into space.f. */
function addPart(space: Workspace, from: number, count: number, trim: number): void {
  const length = space.length + count - 1;
  reserve(space, length);
  const { f, spare, part } = space;
  if (space.length === 1) {
    const weight = f[0];
    for (let n = 0; n < count; n++) f[n] = weight * part[n];
    space.first += from;
    space.length = count;
    return;
  }
  spare.fill(0, 0, length);
  if (space.length < count) spread(f, space.length, part, count, spare);
  else spread(part, count, f, space.length, spare);
  let largest = 0;
  for (let n = 0; n < length; n++) if (spare[n] > largest) largest = spare[n];
  const least = trim * largest;
  let start = 0;
  let end = length;
  while (spare[start] <= least) start++;
  while (spare[end - 1] <= least) end--;
  // Not f.set(spare.subarray(…)): an object at each step of each refit is a tenth of what the collector has to do.
  for (let n = start; n < end; n++) f[n - start] = spare[n];
  space.first += from + start;
  space.length = end - start;
}

/** sums[n + k] += short[k]·long[n]. Four weights a pass: each long value and each sum is then touched a quarter as often. */
function spread(
  short: Float64Array,
  few: number,
  long: Float64Array,
  many: number,
  sums: Float64Array
): void {
  let k = 0;
  for (; k + 4 <= few; k += 4) {
    const a = short[k];
    const b = short[k + 1];
    const c = short[k + 2];
    const d = short[k + 3];
    let one = 0;
    let two = 0;
    let three = 0;
    let n = 0;
    // Four counts a step as well, so that nothing is passed on from one to the next but the last three.
    for (; n + 4 <= many; n += 4) {
      const w = long[n];
      const x = long[n + 1];
      const y = long[n + 2];
      const z = long[n + 3];
      const at = n + k;
      sums[at] += a * w + b * one + (c * two + d * three);
      sums[at + 1] += a * x + b * w + (c * one + d * two);
      sums[at + 2] += a * y + b * x + (c * w + d * one);
      sums[at + 3] += a * z + b * y + (c * x + d * w);
      three = x;
      two = y;
      one = z;
    }
    for (; n < many; n++) {
      const here = long[n];
      sums[n + k] += a * here + b * one + c * two + d * three;
      three = two;
      two = one;
      one = here;
    }
    sums[many + k] += b * one + c * two + d * three;
    sums[many + k + 1] += c * one + d * two;
    sums[many + k + 2] += d * one;
  }
  for (; k < few; k++) {
    const weight = short[k];
    for (let n = 0; n < many; n++) sums[n + k] += weight * long[n];
  }
}
