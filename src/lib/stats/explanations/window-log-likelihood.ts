import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';

/**
 * Σ h_n ln f_n of a histogram under a pmf, lumps by their tail sums; nats.
 *
 * @param window reaches at least to the last count, and with a lump to the end of the support
 * @returns −Infinity when a count was seen that lies outside the window, that is under 1e-598 of its scale
 */
export function windowLogLikelihood(data: FitData, { first, values, scale }: Window): number {
  let sum = 0;
  let seen = 0;
  for (let i = 0; i < data.shots.length; i++) {
    const shots = data.shots[i];
    if (shots === 0) continue;
    const value = values[data.first + i - first] ?? 0;
    if (!(value > 0)) return -Infinity;
    sum += shots * Math.log(value);
    seen += shots;
  }
  if (data.lump) {
    let tail = 0;
    for (let k = values.length - 1; k >= Math.max(0, data.lump.from - first); k--) tail += values[k];
    if (!(tail > 0)) return -Infinity;
    sum += data.lump.shots * Math.log(tail);
    seen += data.lump.shots;
  }
  if (data.below) {
    let head = 0;
    for (let k = 0; k < values.length && k <= data.below.to - first; k++) head += values[k];
    if (!(head > 0)) return -Infinity;
    sum += data.below.shots * Math.log(head);
    seen += data.below.shots;
  }
  return sum - seen * Math.log(scale);
}
