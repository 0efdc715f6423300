import { chiSquareTail } from '../numerics/chi-square-tail';
import { findRoot } from '../numerics/find-root';

/** Of versions with the law of the reference this share may lie above: as much as leaves three standard deviations. */
const ABOVE = 0.0027;
/** Its one-sided quantile of the normal law. */
const WIDE = 2.782;

/** What a report says of the divergence of its counts, nats a shot. */
export interface KnownDivergence {
  shots: number;
  /** Less what chance adds; below 0 for counts smoother than chance makes them. */
  corrected: number;
  /** What chance adds: the mean over resamples of the fitted law. */
  chance: number;
  /** Standard error, of which the interval is 1.96. */
  error: number;
}

/**
 * Upper limit of the corrected divergence of a version, nats a shot: with the law of the reference it lies above with
 * a chance of about 0.27 %.
 *
 * The larger of two. Near the independent trials, 2S(D + chance) of the version is about χ² with 2S·chance degrees of
 * freedom, whatever the reference showed. Far from them both divergences have errors of s²/S + chance/S, s² the variance
 * of ln(p̂/f), and their roots are about normal where they themselves lean to the right. s² is taken from the reference,
 * since a version of another law has another; by chance alone it is some twice the chance times S, which is taken off.
 *
 * Simulated with whole fits of nine laws (N = 12 and 64; 200, 1000 and 5000 shots of either; 1500 draws each, every pair):
 * 0 to 0.40 % of versions with the reference's law lie above; of versions of 200 shots beside a reference over its
 * ceiling up to 0.99 %. A limit from the reference's divergence as if exact would leave 9 %.
 */
export function divergenceLimit(
  reference: KnownDivergence,
  version: Pick<KnownDivergence, 'shots' | 'chance'>
): number {
  const near = chiSquareLimit(2 * version.shots * version.chance) / (2 * version.shots) - version.chance;
  const noise = (of: Pick<KnownDivergence, 'shots' | 'chance'>) => of.chance / of.shots;
  const spread = Math.max(0, reference.error ** 2 - 2 * noise(reference));
  const variance = spread * (1 + reference.shots / version.shots) + noise(reference) + noise(version);
  const middle = Math.sqrt(Math.max(0, reference.corrected) + version.chance);
  const far = (middle + (WIDE * Math.sqrt(variance)) / (2 * middle)) ** 2 - version.chance;
  return Math.max(near, far);
}

/** The value that χ² exceeds with a chance of ABOVE; its degrees of freedom need not be whole. */
function chiSquareLimit(freedom: number): number {
  if (!(freedom > 0)) return 0;
  return findRoot(
    (x) => Math.log(chiSquareTail(x, freedom) / ABOVE),
    freedom,
    4 * freedom + 60,
    1e-9 * freedom
  );
}
