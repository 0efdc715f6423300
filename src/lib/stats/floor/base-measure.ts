import { logChoose } from '../numerics/log-choose';
import { logFactorial } from '../numerics/log-factorial';

/**
 * ln C(N, n), or −ln n! when N is unknown, for n = first … last: what ln f_n must be measured against to be
 * concave under Newton's inequalities.
 */
export function baseMeasure(trials: number | null, first: number, last: number): Float64Array {
  return Float64Array.from({ length: last - first + 1 }, (_, i) =>
    trials === null ? -logFactorial(first + i) : logChoose(trials, first + i)
  );
}
