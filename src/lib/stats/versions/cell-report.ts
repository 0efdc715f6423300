import { normalQuantile } from '../numerics/normal-quantile';
import { logNormalTail } from '../numerics/log-normal-tail';
import { cellMoments } from './cell-moments';
import { controlLimits } from './control-limits';
import { dispersionInterval } from './dispersion-interval';
import { dispersionRise } from './dispersion-rise';
import { notAlike } from './not-alike';
import type { CellReport, VersionCell } from './types';

/** A cell before its marks, with the two-sided p of any other difference: of means, or of a smaller dispersion. */
export interface OpenCell extends Omit<CellReport, 'mark' | 'smallestRise'> {
  pOther: number | null;
  /** Standard error of the logarithm of the rise. */
  riseError: number | null;
}

/**
 * What is told of one cell, and its tests against the reference: the one-sided rise of variance/ceiling, and beside it
 * whether mean or dispersion differ otherwise, two tests doubled for each other (Bonferroni).
 *
 * @param reference the reference's cell of that group; undefined where there is none
 */
export function cellReport(cell: VersionCell, reference: VersionCell | undefined): OpenCell {
  const { shots, known, hindrances } = cellMoments(cell);
  const open: OpenCell = {
    group: cell.group,
    version: cell.version,
    label: cell.label,
    shots,
    mean: null,
    dispersion: null,
    divergence: cell.diagnosis?.divergence ?? null,
    verdict: cell.diagnosis?.verdict ?? null,
    limits: null,
    rise: null,
    hindrances,
    pOther: null,
    riseError: null
  };
  if (!known) return open;
  const { moments, counts } = known;
  open.dispersion = dispersionInterval(moments);
  const half = -normalQuantile(0.025) * moments.meanError;
  open.mean = { value: moments.mean, low: Math.max(0, moments.mean - half), high: moments.mean + half };
  if (!reference || cell === reference) return open;
  const theirs = cellMoments(reference);
  open.hindrances = notAlike(cell, reference);
  if (!theirs.known || open.hindrances.length > 0) return open;
  const limits = controlLimits(theirs.known.moments, { reference: theirs.shots, version: shots });
  // With another number of trials another mean is no finding.
  const sameTrials = cell.trials === reference.trials;
  open.limits = sameTrials ? limits : { ...limits, mean: null };
  const rise = dispersionRise(counts, theirs.known.counts);
  if (!rise) return open;
  open.rise = { factor: rise.factor, p: rise.p, pAdjusted: 1 };
  open.riseError = Math.hypot(moments.error, theirs.known.moments.error);
  const apart =
    (moments.mean - theirs.known.moments.mean) /
    Math.hypot(moments.meanError, theirs.known.moments.meanError);
  const fall = Math.exp(logNormalTail(-rise.z));
  open.pOther = sameTrials
    ? Math.min(1, 2 * Math.min(fall, 2 * Math.exp(logNormalTail(Math.abs(apart)))))
    : fall;
  return open;
}
