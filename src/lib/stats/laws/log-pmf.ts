import type { Law } from '../types';
import { lawWindow } from './law-window';
import { tilt } from './tilt';

/**
 * ln f_n of a Poisson-binomial law at one count, however improbable; −Infinity off the support.
 *
 * f_n = e^{Λ(θ) − θn} f̃_n with θ tilting the mean onto n: f̃_n is then a probability near its mode, and
 * nothing underflows. Relative error of f_n about 1e-16 times |ln f_n|, |θn| or |θ(N−n)|, whichever is largest.
 */
export function logPmf(law: Law, count: number): number {
  if (!Number.isInteger(count) || count < 0) return -Infinity;
  const tilted = tilt(law, count);
  if (!tilted) return atEnd(law, count);
  const window = lawWindow(tilted.law, 1e-25);
  return tilted.exponent + Math.log(window.values[count - window.first] / window.scale);
}

/** The smallest and the largest possible count are products of single probabilities. */
function atEnd(law: Law, count: number): number {
  let sure = 0;
  let possible = 0;
  let none = -law.poissonPart;
  let all = 0;
  for (const { p, trials } of law.levels) {
    if (p >= 1) sure += trials;
    if (p > 0) possible += trials;
    if (p < 1) none += trials * Math.log1p(-p);
    if (p > 0) all += trials * Math.log(p);
  }
  if (count === sure) return none;
  if (count === possible && law.poissonPart === 0) return all;
  return -Infinity;
}
