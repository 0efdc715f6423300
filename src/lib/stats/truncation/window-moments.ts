import type { Window } from '../laws/window';

/** Mean and variance of a window that sums to one. */
export function windowMoments({ first, values, scale }: Window): { mean: number; variance: number } {
  const mean = first + values.reduce((sum, f, i) => sum + (f / scale) * i, 0);
  return { mean, variance: values.reduce((sum, f, i) => sum + (f / scale) * (first + i - mean) ** 2, 0) };
}
