import { deepScale, type Window } from '../laws/window';

/** Nats below the largest value at which doubles of the deep scale end: ln(1e290/1e-308). */
const deepest = 1375;
/** Nats below the largest value, a part 1e-20, under which counts above those asked for are left out. */
const enough = 46;

/** Counts walked at most. Windows that are told reach 10 000; a parameter far off would walk through all 1e9 trials. */
const longest = 200_000;

/**
 * A pmf from its ratios, walked outward in logarithms from any count and normalised by its own sum: no overflow
 * wherever the walk starts, and no gamma functions, whose differences lose digits for large arguments.
 *
 * @param start a count with positive probability
 * @param up f_{n+1}/f_n; 0 ends the walk
 * @param last largest possible count, or Infinity
 * @param upTo counts that must be there; beyond, the walk ends under a part 1e-20 of the largest
 * @returns a window without counts, which no histogram fits, where the law spreads over more than 200 000
 */
export function logWalk(start: number, up: (n: number) => number, last: number, upTo: number): Window {
  const below: number[] = [];
  const above: number[] = [];
  let largest = 0;
  for (let n = start, value = 0; n > 0; n--) {
    value -= Math.log(up(n - 1));
    if (!(value > largest - deepest)) break;
    if (below.length > longest) return nowhere;
    largest = Math.max(largest, value);
    below.push(value);
  }
  for (let n = start, value = 0; n < last; n++) {
    value += Math.log(up(n));
    if (!(value > largest - (n < upTo ? deepest : enough))) break;
    if (above.length > longest) return nowhere;
    largest = Math.max(largest, value);
    above.push(value);
  }
  const logs = [...below.reverse(), 0, ...above];
  let sum = 0;
  for (const value of logs) sum += Math.exp(value - largest);
  // Far down the scale goes into the exponential, which would underflow 300 decades earlier without it; near the
  // top it must not, since an exponent of 667 costs three digits.
  const factor = deepScale / sum;
  const lift = Math.log(factor) - largest;
  const at = (value: number) =>
    value > largest - 600 ? Math.exp(value - largest) * factor : Math.exp(value + lift);
  return {
    first: start - below.length,
    values: Float64Array.from(logs, at),
    scale: deepScale
  };
}

const nowhere: Window = { first: 0, values: new Float64Array(0), scale: deepScale };
