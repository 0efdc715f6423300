import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import type { Generator } from '../random/generator';
import { histogramSampler } from '../random/histogram-sampler';

/** Draws histograms of `total` shots from a law, shaped like the one observed (same lump, same N). */
export interface Redraw {
  /** A full histogram: empty shots are in it. */
  draw(generator: Generator): FitData;
}

/**
 * @param window law to draw from; trimmed at 1e-18 or finer
 * @param like histogram whose trials and lump are copied
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
  let end = drawn.length;
  let lump: FitData['lump'] = null;
  if (like.lump) {
    lump = { from: like.lump.from, shots: 0 };
    for (; end > 0 && first + end - 1 >= like.lump.from; end--) lump.shots += drawn[end - 1];
    if (lump.shots === 0) lump = null;
  }
  let start = 0;
  while (start < end && drawn[start] === 0) start++;
  while (end > start && drawn[end - 1] === 0) end--;
  return {
    trials: like.trials,
    first: first + start,
    shots: drawn.slice(start, end),
    lump,
    total,
    withoutEmpty: false
  };
}
