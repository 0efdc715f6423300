import { neighbours } from '../explanations/stories/neighbours';
import { outwardWindow } from '../laws/outward-window';
import { deepScale, type Window } from '../laws/window';
import { chainWindow } from '../misread/chain-window';
import type { Effect } from './effect';
import { largestEffect } from './largest-effect';

/**
 * Law of the counts under an effect, the mean kept.
 *
 * - excess: beta-binomial with correlation excess/(N − 1); N unknown: negative binomial, variance mean·(1 + excess).
 * - pairs: beta-binomial with that correlation.
 * - neighbours: the two-state chain of the explanations.
 * - misread: independent kinks p on N bonds of an open chain read through flips ε, with p such that the mean as read
 *   stays: p = (μ/N − t)/(1 − 2t), t = 2ε(1 − ε).
 *
 * @returns null where the effect cannot have this size, or the mean lies outside 0 … N
 */
export function effectWindow(effect: Effect): Window | null {
  const { kind, size, mean, trials } = effect;
  if (!(mean > 0 && size > 0 && size < largestEffect(effect))) return null;
  if (trials === null) return kind === 'excess' ? negativeBinomial(mean, size) : null;
  if (!(mean < trials)) return null;
  const p = mean / trials;
  if (kind === 'excess') return betaBinomial(trials, p, size / (trials - 1));
  if (kind === 'pairs') return betaBinomial(trials, p, size);
  if (kind === 'neighbours') return neighbours.window(p, [size], trials, trials);
  const toggled = 2 * size * (1 - size);
  return chainWindow([{ p: (p - toggled) / (1 - 2 * toggled), trials }], size, trim);
}

/** Part of the mode under which probabilities are left out. */
const trim = 1e-18;

/** f_{n+1}/f_n = (N−n)(a+n)/((n+1)(b+N−n−1)), a + b = 1/ρ − 1. Both ends may be likelier than the middle. */
function betaBinomial(trials: number, p: number, correlation: number): Window {
  const weight = 1 / correlation - 1;
  const [a, b] = [weight * p, weight * (1 - p)];
  const up = (n: number) => ((trials - n) * (a + n)) / ((n + 1) * (b + trials - n - 1));
  const mode = Math.floor(trials * p);
  // A law with two humps has to be followed to both ends.
  const cut = a < 1 || b < 1 ? 0 : trim;
  return outwardWindow(mode, (n) => 1 / up(n - 1), up, cut, deepScale);
}

/** f_{n+1}/f_n = (r+n)/(n+1) · β/(1+β), r = mean/β. */
function negativeBinomial(mean: number, excess: number): Window {
  const r = mean / excess;
  const up = (n: number) => ((r + n) / (n + 1)) * (excess / (1 + excess));
  const mode = Math.max(0, Math.floor(mean - excess));
  return outwardWindow(mode, (n) => 1 / up(n - 1), up, trim, deepScale);
}
