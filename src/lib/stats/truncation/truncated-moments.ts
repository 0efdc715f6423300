import type { Law } from '../types';
import { truncatedLaw, type KeptCounts } from './truncated-law';

/** Mean and variance of the counts kept of a law; null when none is. */
export function truncatedMoments(law: Law, kept: KeptCounts): { mean: number; variance: number } | null {
  const window = truncatedLaw(law, kept, 1);
  if (!window) return null;
  const { first, values } = window;
  const mean = first + values.reduce((sum, f, i) => sum + f * i, 0);
  return { mean, variance: values.reduce((sum, f, i) => sum + f * (first + i - mean) ** 2, 0) };
}
