import type { Cumulants } from '../laws/law-moments';
import type { Window } from '../laws/window';

/** First four cumulants of a law given by its probabilities. */
export function windowCumulants({ first, values, scale }: Window): Cumulants {
  let total = 0;
  let start = 0;
  values.forEach((value, i) => {
    total += value / scale;
    start += (first + i) * (value / scale);
  });
  const mean = start / total;
  let [second, third, fourth] = [0, 0, 0];
  values.forEach((value, i) => {
    const d = first + i - mean;
    const weight = value / scale / total;
    second += weight * d * d;
    third += weight * d * d * d;
    fourth += weight * d * d * d * d;
  });
  return { mean, variance: second, third, fourth: fourth - 3 * second * second };
}
