import type { FitData } from '../fit/fit-data';
import type { StoryModel } from './story-model';

/** Part of a parameter by which it is moved for a difference: the slope's error is then of that order, far below what shots resolve. */
const nudge = 1e-6;

/**
 * Slope of the log-likelihood and the expected information of all shots, g_j = Σ h_n ∂_j f_n/f_n and
 * I_jk = S Σ ∂_j f_n ∂_k f_n/f_n, both over the counts seen (a lump at either end is one cell).
 */
export function scoring(
  model: StoryModel,
  data: FitData,
  x: number[]
): { gradient: number[]; information: number[] } {
  const size = x.length;
  const here = cellsOf(data, model.window(x));
  const slopes = x.map((at, j) => {
    const size = nudge * (Math.abs(at) + 1e-3);
    const move = at + size > model.high[j] ? -size : size;
    const moved = x.slice();
    moved[j] = at + move;
    const real = moved[j] - at;
    return cellsOf(data, model.window(moved)).map((value, i) => (value - here[i]) / real);
  });
  const gradient = new Array<number>(size).fill(0);
  const information = new Array<number>(size * size).fill(0);
  for (let i = 0; i < here.length; i++) {
    if (!(here[i] > 0)) continue;
    const shots =
      i < data.shots.length
        ? data.shots[i]
        : i === data.shots.length && data.lump
          ? data.lump.shots
          : data.below!.shots;
    for (let j = 0; j < size; j++) {
      const relative = slopes[j][i] / here[i];
      gradient[j] += shots * relative;
      for (let k = 0; k <= j; k++) information[j * size + k] += data.total * slopes[k][i] * relative;
    }
  }
  for (let j = 0; j < size; j++)
    for (let k = 0; k < j; k++) information[k * size + j] = information[j * size + k];
  return { gradient, information };
}

/** Probabilities of the counts from the first to the last seen, then of the lump and of the opening row. */
function cellsOf(data: FitData, window: { first: number; values: Float64Array; scale: number }): number[] {
  const { first, values, scale } = window;
  const cells = Array.from(data.shots, (_, i) => (values[data.first + i - first] ?? 0) / scale);
  if (data.lump) {
    let tail = 0;
    for (let k = values.length - 1; k >= Math.max(0, data.lump.from - first); k--) tail += values[k];
    cells.push(tail / scale);
  }
  if (data.below) {
    let head = 0;
    for (let k = 0; k < values.length && k <= data.below.to - first; k++) head += values[k];
    cells.push(head / scale);
  }
  return cells;
}
