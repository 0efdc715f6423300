import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';

/** A law laid over the counts of a histogram, with what lies outside. */
export interface Cells {
  /** f at counts data.first, data.first + 1, … (conditioned on n ≥ 1 when empty shots are set aside). */
  law: Float64Array;
  /** Probability below the listed counts; of the opening row when there is one. */
  below: number;
  /** Probability above the listed counts; of the lump when there is one. */
  above: number;
}

/** Probabilities of a window at the counts of `data`; smallest terms summed first outside. */
export function cells(data: FitData, window: Window): Cells {
  const length = data.shots.length;
  const law = new Float64Array(length);
  const shift = data.first - window.first;
  const rest = data.withoutEmpty && window.first === 0 ? 1 - window.values[0] / window.scale : 1;
  const unit = 1 / (window.scale * rest);
  let below = 0;
  let above = 0;
  const lowest = data.withoutEmpty && window.first === 0 ? 1 : 0;
  for (let k = lowest; k < Math.min(shift, window.values.length); k++) below += window.values[k] * unit;
  for (let k = window.values.length - 1; k >= Math.max(lowest, shift + length); k--)
    above += window.values[k] * unit;
  for (let i = Math.max(0, -shift); i < length && i + shift < window.values.length; i++) {
    law[i] = window.values[i + shift] * unit;
  }
  return { law, below, above };
}
