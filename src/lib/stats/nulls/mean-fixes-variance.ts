import type { KeptCounts } from '../truncation/truncated-law';

/**
 * Whether counts can take two neighbouring values only, as those of one trial do or of a cut that leaves two: their mean
 * then says what their variance is, whatever made them, and no excess can be seen.
 */
export const meanFixesVariance = (trials: number | null, kept: KeptCounts | null): boolean =>
  trials === 1 || (kept !== null && Math.min(kept.to, trials ?? Infinity) - kept.from === 1);
