import { ceiling } from './ceiling';

/** One limit that the first three cumulants of independent trials obey. */
export interface MomentCondition {
  id: 'variance-ceiling' | 'third-floor' | 'third-ceiling';
  /** The cumulant the limit is for: κ2 or κ3. */
  value: number;
  limit: number;
  /** How far inside the limit the value lies, in the cumulant's own units; negative outside. */
  slack: number;
  /** True inside, on the limit, and outside by rounding alone (1e-12 of the largest term). */
  holds: boolean;
}

/**
 * Whether any probabilities p_k can have these first three cumulants: the three positive semidefinite matrices
 * [s0 s1; s1 s2], [s1 s2; s2 s3], [s0−s1 s1−s2; s1−s2 s2−s3] of the power sums, s0 = N.
 *
 * @param trials N, or null when unknown or unbounded: then s0 = ∞
 * @param cumulants κ1 … κ3, for instance from a published table; the table's own errors are not looked at
 * @returns the three conditions, each solved for its highest cumulant. In this order they say κ2 ≤ μ − μ²/N;
 *   κ3 ≥ s1 − 3s2 + 2s2²/s1; κ3 ≤ s1 − 3s2 + 2(s2 − (s1−s2)²/(N−s1)). Together they also keep μ in 0 … N and
 *   κ2 ≥ 0. Limits are ±Infinity or NaN where μ lies outside 0 … N, and the condition then fails.
 *
 * Necessary for every N, and sufficient for weights Σ p^r of a measure on [0, 1] of mass N, not for whole trials.
 * Source: the truncated Hausdorff moment problem (Shohat & Tamarkin 1943).
 */
export function momentBody(
  trials: number | null,
  cumulants: { mean: number; variance: number; third: number }
): MomentCondition[] {
  const { mean, variance, third } = cumulants;
  const s2 = mean - variance;
  const base = mean - 3 * s2;
  const scale = Math.abs(mean) + Math.abs(variance) + Math.abs(third);
  const blur = 1e-12 * scale;
  const inner = trials === null ? s2 : s2 - over(variance * variance, trials - mean, blur);
  const condition = (id: MomentCondition['id'], value: number, limit: number, slack: number) => ({
    id,
    value,
    limit,
    slack,
    holds: slack >= -blur
  });
  const top = ceiling(mean, trials);
  const floor = base + 2 * over(s2 * s2, mean, blur);
  const roof = base + 2 * inner;
  return [
    condition('variance-ceiling', variance, top, top - variance),
    condition('third-floor', third, floor, third - floor),
    condition('third-ceiling', third, roof, roof - third)
  ];
}

/** x²/y as the limit of a determinant: 0/0, up to rounding, asks for nothing, a negative y cannot be met. */
function over(square: number, y: number, blur: number): number {
  // All trials sure but for 6e-16 of one: the mean is then rounded to N, while the variance is not yet 0.
  if (Math.abs(y) <= blur && square <= blur * blur) return 0;
  if (y < 0) return Infinity;
  return square === 0 ? 0 : square / y;
}
