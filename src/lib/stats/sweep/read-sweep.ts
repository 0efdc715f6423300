import { BadInput } from '../types';
import type { SweepOptions } from './types';

/** Most datasets of one sweep. */
export const MOST_SWEPT = 1000;

/**
 * The datasets of a sweep in order of time, those of equal time in the order given.
 *
 * @throws BadInput for fewer than two datasets or over 1000, a time that is not positive, times that are all the same,
 *   a level outside (0, ½), or a window that holds fewer than two of the times
 */
export function readSweep<One extends { label: string; time: number }>(
  inputs: One[],
  { alpha, window }: SweepOptions
): One[] {
  if (!(alpha > 0 && alpha < 0.5)) throw new BadInput('The level must be above 0 and below 0.5.');
  if (inputs.length < 2)
    throw new BadInput('A sweep needs at least two datasets, taken with different times.');
  if (inputs.length > MOST_SWEPT) throw new BadInput(`A sweep holds at most ${MOST_SWEPT} datasets.`);
  for (const { label, time } of inputs)
    if (!(time > 0 && time < Infinity))
      throw new BadInput(
        `“${label}” has a time of ${time}: on a logarithmic axis a time is above 0. Leave it out, or give the time.`
      );
  const sorted = [...inputs].sort((a, b) => a.time - b.time);
  if (sorted[0].time === sorted[sorted.length - 1].time)
    throw new BadInput('All datasets have the same time: nothing was swept.');
  if (window) {
    const held = new Set(
      sorted.map(({ time }) => time).filter((time) => time >= window.from && time <= window.to)
    );
    if (held.size < 2) throw new BadInput('The window holds fewer than two different times: widen it.');
  }
  return sorted;
}
