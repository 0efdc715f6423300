import { surest } from '$lib/stats/drift/surest';
import type { BatchSplit, DriftPart } from '$lib/stats/drift/types';
import type { Diagnosis } from '$lib/stats/types';
import { capital } from '../capital';
import { formatCount, formatNumber } from '../format-number';
import { TESTS } from '../labels';
import { sayInterval } from '../say-interval';
import { sayP } from '../say-p';
import { sayFlagged } from './say-flagged';

/** What is known of the order of the shots, and what the tests of it say. */
export function sayDrift(document: Diagnosis): string {
  if (!document.data.ordered)
    return 'The order of the shots is not known: a probability that drifts between shots widens the counts, and cannot be told from bunching here.';
  const ran = document.tests.filter(({ id }) => id === 'batches' || id === 'order');
  const said = ran.map(
    (test) =>
      `${capital(TESTS[test.id])}: a result as extreme ${sayP(test.p, test.smallestP, test.resamples)}.`
  );
  return `The order of the shots is known. ${said.length > 0 ? said.join(' ') : 'No test of it could run.'}${sayFlagged(document, 'drift')}`;
}

/** What is left of an excess within batches, with the parts of the excess; null where there is no shot list. */
export function sayWithin(drift: DriftPart | undefined): string | null {
  if (!drift) return null;
  const { split, statement } = drift;
  if (!split || split.dispersion.value === null) return statement;
  const { excess, excessBetween, excessWithin, meansVariance, tested, worst } = split;
  const single =
    worst === null
      ? 'No batch has enough defects to be tested by itself.'
      : `Of the ${formatCount(tested)} batches large enough to be tested alone, batch ${formatCount(worst.batch)} is the most telling: ${formatNumber(worst.dispersion, 3)} times its ceiling, and a value as large ${sayP(worst.p!, 0, 0)}, before ${formatCount(tested)} batches are allowed for.`;
  return `${statement} Variance above the ceiling: ${formatNumber(excess, 3)} in all, ${sayInterval(excessWithin, 3)} within batches, ${formatNumber(excessBetween, 3)} between them. ${sayMeans(meansVariance)} ${single} ${sayInside(split.order)}`;
}

/** Variance of the true means of the batches; an estimate below 0 is what chance alone gives in half of all cases. */
function sayMeans(variance: BatchSplit['meansVariance']): string {
  const told = sayInterval(variance, 3);
  return variance.value !== null && variance.value < 0
    ? `The means of the batches vary no more than chance has them: their true variance, which is never below 0, comes out at ${told}.`
    : `The true means of the batches have a variance of ${told}.`;
}

/** Neighbouring shots of a batch: whether the rate moved inside batches. */
function sayInside(order: BatchSplit['order']): string {
  if (!order) return 'Drift inside a batch is not taken out.';
  return `Neighbouring shots of a batch are correlated by ${formatNumber(order.correlation, 2)}: one as large ${sayP(order.p, surest, 0)} if their order meant nothing, ${order.moved ? 'so the rate changed inside batches too' : 'so no drift inside batches is seen'}. From one shot to the next the variance is ${sayInterval(order.dispersion, 3)} times the ceiling.`;
}

/** The change of the mean that the shots support most; null where none was sought. */
export function sayChange(drift: DriftPart | undefined): string | null {
  if (!drift?.change) return null;
  const { shot, before, after, p, smallestP, resamples } = drift.change;
  return `The single change best supported is at shot ${formatCount(shot)}: mean ${formatNumber(before)} before, ${formatNumber(after)} from there on. One as well supported ${sayP(p, smallestP, resamples)} if no shot differed from another, every place for the change allowed for.`;
}
