import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import type { Generator } from '../random/generator';
import { histogramSampler } from '../random/histogram-sampler';

/** Draws histograms of `total` shots from a law, shaped like the one observed (same lumps, same N). */
export interface Redraw {
  /** A full histogram: empty shots are in it. */
  draw(generator: Generator): FitData;
}

/**
 * @param window law to draw from; trimmed at 1e-18 or finer
 * @param like histogram whose trials and lumps are copied
 * @param total shots to draw
 */
export function redraw(window: Window, like: FitData, total: number): Redraw {
  const sampler = histogramSampler(window.values);
  const into = new Float64Array(window.values.length);
  return {
    draw(generator) {
      sampler.draw(generator, total, into);
      return trimmed(into, window.first, like, total);
    }
  };
}

function trimmed(drawn: Float64Array, first: number, like: FitData, total: number): FitData {
  let start = 0;
  let end = drawn.length;
  let lump: FitData['lump'] = null;
  let below: FitData['below'] = null;
  if (like.lump) {
    lump = { from: like.lump.from, shots: 0 };
    for (; end > 0 && first + end - 1 >= like.lump.from; end--) lump.shots += drawn[end - 1];
    if (lump.shots === 0) lump = null;
  }
  if (like.below) {
    below = { to: like.below.to, shots: 0 };
    for (; start < end && first + start <= like.below.to; start++) below.shots += drawn[start];
    if (below.shots === 0) below = null;
  }
  while (start < end && drawn[start] === 0) start++;
  while (end > start && drawn[end - 1] === 0) end--;
  // Up to the lumps that are there, as in fitData: what lies outside is then theirs alone.
  const from = below ? below.to + 1 : first + start;
  const to = lump ? lump.from : Math.max(from, first + end);
  let shots: Float64Array;
  if (from === first + start && to === first + end) shots = drawn.slice(start, end);
  else {
    shots = new Float64Array(to - from);
    shots.set(drawn.subarray(start, end), end > start ? first + start - from : 0);
  }
  return { trials: like.trials, first: from, shots, lump, below, total, withoutEmpty: false };
}
