import type { Law } from '../types';
import { binomialWindow } from './binomial-window';
import { convolve } from './convolve';
import { poissonWindow } from './poisson-window';
import { deepScale, type Window } from './window';

/**
 * Poisson-binomial pmf of a law given by its levels, as a window: G(z) = e^{γ(z−1)} Π (1−p+pz)^m.
 *
 * @param law levels p ∈ [0, 1] with whole multiplicities, and the Poisson part γ ≥ 0
 * @param trim part of the largest value below which the ends are left out. 0 (the default) keeps relative
 *   accuracy of about 1e-13 for every probability down to 1e-300.
 *
 * Parts are joined in pairs, pairs in fours, and so on: for N distinct probabilities that costs about as
 * much as its last join, where adding trials one at a time would cost N times the width.
 */
export function lawWindow(law: Law, trim = 0, scale = deepScale): Window {
  const parts: Window[] = [];
  let shift = 0;
  const add = (part: Window) => {
    // One count alone, such as sure trials, only shifts.
    if (part.values.length === 1) shift += part.first;
    else parts.push(part);
  };
  for (const { p, trials } of law.levels) {
    // Its window would be one count, 0; thousands of such levels are common among Landau–Zener modes.
    const never = p <= 0 || trials * p < 0.5 * trim;
    if (trials > 0 && !never) add(binomialWindow(trials, p, trim, scale));
  }
  if (law.poissonPart > 0) add(poissonWindow(law.poissonPart, trim, scale));
  if (parts.length === 0) return { first: shift, values: Float64Array.of(scale), scale };
  // Narrow parts first, so that equals meet equals.
  parts.sort((f, g) => f.values.length - g.values.length);
  const joined = join(parts, 0, parts.length, trim);
  return { ...joined, first: joined.first + shift };
}

function join(parts: Window[], from: number, to: number, trim: number): Window {
  if (to - from === 1) return parts[from];
  const middle = (from + to) >> 1;
  return convolve(join(parts, from, middle, trim), join(parts, middle, to, trim), trim);
}
