import { logPmf } from '../laws/log-pmf';
import { lawWindow } from '../laws/law-window';
import type { Window } from '../laws/window';
import type { Law } from '../types';
import type { FitData } from './fit-data';

/**
 * Σ h_n ln f_n of a histogram under a given law, lumps by their tail sums; nats. −Infinity when a count was
 * seen that the law forbids.
 *
 * A count beyond the trimmed window is looked up in the whole one, which reaches down to 1e-300, and takes the
 * exact logarithm beyond that: each of those costs as much as the window, and a narrow law under broad counts
 * has hundreds.
 */
export function lawLogLikelihood(data: FitData, law: Law): number {
  const { first, values } = lawWindow(law, 1e-25, 1);
  let whole: Window | null = null;
  const outside = (count: number): number => {
    whole ??= lawWindow(law);
    const value = whole.values[count - whole.first] ?? 0;
    return value > 1e-290 * whole.scale ? Math.log(value / whole.scale) : logPmf(law, count);
  };
  let sum = 0;
  for (let i = 0; i < data.shots.length; i++) {
    const shots = data.shots[i];
    if (shots === 0) continue;
    const k = data.first + i - first;
    const inside = k >= 0 && k < values.length && values[k] > 1e-18;
    sum += shots * (inside ? Math.log(values[k]) : outside(data.first + i));
  }
  if (data.lump) {
    let tail = 0;
    for (let k = values.length - 1; k >= Math.max(0, data.lump.from - first); k--) tail += values[k];
    sum += data.lump.shots * (tail > 1e-12 ? Math.log(tail) : farTail(outside, data.lump.from));
  }
  if (data.below) {
    let head = 0;
    for (let k = 0; k < values.length && k <= data.below.to - first; k++) head += values[k];
    sum += data.below.shots * (head > 1e-12 ? Math.log(head) : farTail(outside, data.below.to, -1));
  }
  return sum;
}

/** ln P(X ≥ from) far above the mean (`step` −1: ln P(X ≤ from) far below), where probabilities fall from count to count. */
function farTail(logPmfAt: (count: number) => number, from: number, step = 1): number {
  const nearest = logPmfAt(from);
  if (nearest === -Infinity) return nearest;
  let sum = 1;
  for (let n = from + step, term = 1; n >= 0 && term > 1e-16 * sum; n += step) {
    term = Math.exp(logPmfAt(n) - nearest);
    sum += term;
  }
  return nearest + Math.log(sum);
}
