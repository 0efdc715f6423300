import { poissonWindow } from '../laws/poisson-window';
import { reserve, type Workspace } from './workspace';

/** As for binomials; a Poisson law's upper side falls more slowly, hence the room to spare. */
const deviations = 13;

/** Poisson pmf into space.part, ends under `trim` of the mode left out. Returns [first count, length]. */
export function poissonInto(space: Workspace, mean: number, trim: number): [number, number] {
  if (trim === 0) {
    const window = poissonWindow(mean, 0, 1);
    reserve(space, window.values.length);
    space.part.set(window.values);
    return [window.first, window.values.length];
  }
  const mode = Math.floor(mean);
  const reach = Math.ceil(deviations * Math.sqrt(mean)) + 60;
  const below = Math.min(mode, reach);
  reserve(space, below + reach + 1);
  const { part } = space;
  part[below] = 1;
  let sum = 1;
  let first = below;
  for (let value = 1, n = mode; first > 0; n--) {
    value *= n / mean;
    if (value < trim) break;
    part[--first] = value;
    sum += value;
  }
  let last = below;
  for (let value = 1, n = mode; last < below + reach; n++) {
    value *= mean / (n + 1);
    if (value < trim) break;
    part[++last] = value;
    sum += value;
  }
  const length = last - first + 1;
  const over = 1 / sum;
  for (let i = 0; i < length; i++) part[i] = part[first + i] * over;
  return [mode - (below - first), length];
}
