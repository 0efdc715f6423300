import { logNormalTail } from '../numerics/log-normal-tail';
import { cellMoments, type CellMoments } from './cell-moments';
import { dispersionInterval } from './dispersion-interval';
import { dispersionRise } from './dispersion-rise';
import { notAlike } from './not-alike';
import { sayHindrance, type PlainHindrance } from './say-hindrance';
import { smallestSeen } from './smallest-seen';
import type { GateGroup, GateRule, Hindrance, VersionCell } from './types';

/** A group with its tests, before they are adjusted for each other. */
export type OpenGroup = Omit<GateGroup, 'outcome'>;

/**
 * The two tests of one group, and what stands in the way of its being judged.
 *
 * @param tests how many the gate makes in all
 * @param cell, reference undefined where there are no counts
 */
export function gateGroup(
  { group, rule, version, tests }: { group: string; rule: GateRule; version: string; tests: number },
  cell: VersionCell | undefined,
  reference: VersionCell | undefined
): OpenGroup {
  const own = rule.reference === version;
  const found: OpenGroup = {
    group,
    dispersion: null,
    referenceDispersion: null,
    overTolerance: null,
    overReference: null,
    smallestExcess: null,
    smallestRise: null,
    hindrances: [],
    reasons: []
  };
  const stop = (hindrance: PlainHindrance, name: string) => {
    found.hindrances.push(hindrance);
    found.reasons.push(sayHindrance(hindrance, name));
  };
  const take = (one: VersionCell | undefined, name: string): CellMoments['known'] => {
    if (!one) stop('no-counts', name);
    if (!one) return null;
    if (one.diagnosis === null) stop('not-diagnosed', name);
    const { known, hindrances } = cellMoments(one);
    for (const hindrance of hindrances) if (isPlain(hindrance)) stop(hindrance, name);
    return known;
  };
  const mine = take(cell, version);
  const level = rule.alpha / tests;
  if (mine) {
    found.dispersion = dispersionInterval(mine.moments);
    const z = (mine.moments.log - Math.log1p(rule.tolerance)) / mine.moments.error;
    found.overTolerance = { z, p: upper(z), pAdjusted: 1 };
    // Seen over the tolerance, not over the ceiling: (1 + tolerance)·exp(zσ) − 1.
    found.smallestExcess = (1 + rule.tolerance) * (1 + smallestSeen(mine.moments.error, level)) - 1;
  }
  if (own) return found;
  if (rule.reference === null) {
    stop('no-reference', version);
    return found;
  }
  const theirs = take(reference, rule.reference);
  if (theirs) found.referenceDispersion = dispersionInterval(theirs.moments);
  const apart = cell && reference ? notAlike(cell, reference) : [];
  for (const hindrance of apart) if (isPlain(hindrance)) stop(hindrance, version);
  if (!mine || !theirs || apart.length > 0) return found;
  const rise = dispersionRise(mine.counts, theirs.counts);
  if (rise) found.overReference = { ...rise, pAdjusted: 1 };
  found.smallestRise = smallestSeen(Math.hypot(mine.moments.error, theirs.moments.error), level);
  return found;
}

const isPlain = (hindrance: Hindrance): hindrance is PlainHindrance =>
  hindrance !== 'too-few-shots' && hindrance !== 'above-tolerance';

const upper = (z: number): number => Math.min(1, Math.exp(logNormalTail(z)));
