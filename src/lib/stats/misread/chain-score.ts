import type { FitData } from '../fit/fit-data';
import type { ChainSpace } from './chain-space';

/** Counts that could be kept: those outside were set aside, and the law is conditioned on the rest. */
export interface Kept {
  from: number;
  to: number;
}

/** Log-likelihood of a histogram under the law of a space, its slope and its curvature (Fisher's, from what was seen). */
export interface ChainScore {
  value: number;
  /** ∂L/∂p_j. */
  slope: Float64Array;
  /** Σ h (∂ln f/∂p_i)(∂ln f/∂p_j), row by row. */
  curvature: Float64Array;
}

/**
 * L = Σ h_n ln f_n + h_lump ln P(n ≥ from) + h_below ln P(n ≤ to) − S ln P(kept), and its slopes in the p of each level.
 *
 * @param levels number of levels of the chain in the space
 * @returns value −Infinity when a count was seen that the law forbids
 */
export function chainScore(space: ChainSpace, levels: number, data: FitData, kept: Kept | null): ChainScore {
  const { f, g, df, dg, low, high } = space;
  const slope = new Float64Array(levels);
  const curvature = new Float64Array(levels * levels);
  const failed = { value: -Infinity, slope, curvature };
  // Of ln P(kept), taken off every cell.
  const norm = new Float64Array(levels);
  let logKept = 0;
  if (kept) {
    const part = sums(Math.max(low, kept.from), Math.min(high, kept.to));
    if (!(part.value > 0)) return failed;
    logKept = Math.log(part.value);
    for (let j = 0; j < levels; j++) norm[j] = part.slopes[j] / part.value;
  }
  let value = 0;
  const relative = new Float64Array(levels);
  const add = (shots: number, probability: number): boolean => {
    if (!(probability > least)) return false;
    value += shots * (Math.log(probability) - logKept);
    for (let i = 0; i < levels; i++) {
      slope[i] += shots * relative[i];
      for (let j = 0; j <= i; j++) curvature[i * levels + j] += shots * relative[i] * relative[j];
    }
    return true;
  };
  for (let i = 0; i < data.shots.length; i++) {
    const shots = data.shots[i];
    if (shots === 0) continue;
    const n = data.first + i;
    if (n < low || n > high) return failed;
    const probability = f[n] + g[n];
    for (let j = 0; j < levels; j++) relative[j] = (df[j][n] + dg[j][n]) / probability - norm[j];
    if (!add(shots, probability)) return failed;
  }
  if (data.lump && data.lump.shots > 0) {
    const part = sums(Math.max(low, data.lump.from), Math.min(high, kept?.to ?? high));
    for (let j = 0; j < levels; j++) relative[j] = part.slopes[j] / part.value - norm[j];
    if (!add(data.lump.shots, part.value)) return failed;
  }
  if (data.below && data.below.shots > 0) {
    const part = sums(Math.max(low, kept?.from ?? low), Math.min(high, data.below.to));
    for (let j = 0; j < levels; j++) relative[j] = part.slopes[j] / part.value - norm[j];
    if (!add(data.below.shots, part.value)) return failed;
  }
  for (let i = 0; i < levels; i++)
    for (let j = i + 1; j < levels; j++) curvature[i * levels + j] = curvature[j * levels + i];
  return { value, slope, curvature };

  function sums(from: number, to: number): { value: number; slopes: Float64Array } {
    let total = 0;
    const slopes = new Float64Array(levels);
    for (let n = to; n >= from; n--) {
      total += f[n] + g[n];
      for (let j = 0; j < levels; j++) slopes[j] += df[j][n] + dg[j][n];
    }
    return { value: total, slopes };
  }
}

/** A probability this small is rounding of a trimmed law, or nothing. */
const least = 1e-290;
