import type { ReadOptions, Suggested } from './types';

/** Largest count allowed: as the person says, else as the file states; null for no limit. */
export function trialsLimit(
  options: ReadOptions,
  suggested: Suggested
): { trials: number | null; why: string } {
  if (options.trials !== undefined) return { trials: options.trials, why: 'given' };
  return { trials: suggested.trials ?? null, why: 'stated in the file' };
}
