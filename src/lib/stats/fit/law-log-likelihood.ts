import { logPmf } from '../laws/log-pmf';
import { lawWindow } from '../laws/law-window';
import type { Window } from '../laws/window';
import type { Law } from '../types';
import type { FitData } from './fit-data';

/**
 * Σ h_n ln f_n of a histogram under a given law, a lump by its tail sum; nats. −Infinity when a count was
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
  return sum;
}

/** ln P(X ≥ from) far above the mean, where probabilities fall from count to count. */
function farTail(logPmfAt: (count: number) => number, from: number): number {
  const nearest = logPmfAt(from);
  if (nearest === -Infinity) return nearest;
  let sum = 1;
  for (let n = from + 1, term = 1; term > 1e-16 * sum; n++) {
    term = Math.exp(logPmfAt(n) - nearest);
    sum += term;
  }
  return nearest + Math.log(sum);
}
