import { binomialWindow } from '../laws/binomial-window';
import { reserve, type Workspace } from './workspace';

/** Nine and a half standard deviations reach 1e-20 of the mode in a normal law; twelve and some to spare. */
const deviations = 12;

/**
 * Binomial pmf into space.part, ends under `trim` of the mode left out: binomialWindow without new arrays,
 * since this is the innermost step of every refit. Returns [first count, length].
 */
export function binomialInto(space: Workspace, trials: number, p: number, trim: number): [number, number] {
  if (trim === 0) return copied(space, trials, p);
  const odds = p / (1 - p);
  const mode = Math.min(trials, Math.floor((trials + 1) * p));
  const reach = Math.ceil(deviations * Math.sqrt(trials * p * (1 - p))) + 40;
  const below = Math.min(mode, reach);
  const above = Math.min(trials - mode, reach);
  reserve(space, below + above + 1);
  const { part } = space;
  part[below] = 1;
  let sum = 1;
  let first = below;
  const back = 1 / odds;
  for (let value = 1, n = mode; first > 0; n--) {
    value *= (n / (trials - n + 1)) * back;
    if (value < trim) break;
    part[--first] = value;
    sum += value;
  }
  let last = below;
  for (let value = 1, n = mode; last < below + above; n++) {
    value *= ((trials - n) / (n + 1)) * odds;
    if (value < trim) break;
    part[++last] = value;
    sum += value;
  }
  const length = last - first + 1;
  const over = 1 / sum;
  for (let i = 0; i < length; i++) part[i] = part[first + i] * over;
  return [mode - (below - first), length];
}

function copied(space: Workspace, trials: number, p: number): [number, number] {
  const window = binomialWindow(trials, p, 0, 1);
  reserve(space, window.values.length);
  space.part.set(window.values);
  return [window.first, window.values.length];
}
