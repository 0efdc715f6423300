import { sayHowOften } from '../words/say-p';
import { formatNumber } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import { insideBatches } from './split-excess';
import type { BatchSplit } from './types';
import { surest } from './surest';

/**
 * What is left of an excess when batches are tested one by one and pooled, in a sentence.
 *
 * @param excessShown whether the variance of all shots together breaks the ceiling
 */
export function driftStatement(split: BatchSplit, excessShown: boolean): string {
  const { dispersion, order, p, pTogether, smallestP, tested, verdict, worst } = split;
  if (dispersion.value === null || pTogether === null)
    return 'Within batches there are too few defects to test them.';
  const measured = `Tested batch by batch and pooled, the variance is ${sayInterval(dispersion, 3)} times the ceiling:`;
  if (verdict === 'compatible')
    return excessShown
      ? `${measured} within batches the counts are compatible with independent trials; the excess lies between batches.`
      : `${measured} within batches too the counts keep the ceiling.`;
  if (verdict === 'excess') {
    const often = sayHowOften(pTogether, smallestP);
    // One batch may carry it alone, and then the pooled variance beside it is no excess.
    if (
      worst !== null &&
      worst.p !== null &&
      (p === null || tested * worst.p < p / 10) &&
      dispersion.low !== null &&
      dispersion.low <= 1
    )
      return `${measured} that is no excess, but batch ${worst.batch} of ${split.batches} has one by itself. One as large in any of them ${often} if trials were independent.`;
    const beside = order?.moved
      ? ` The rate changed inside batches too, but the variance from one shot to the next is still ${sayInterval(order.dispersion, 3)} times the ceiling.`
      : '';
    return excessShown
      ? `${measured} the excess survives within batches. One as large ${often} if only the rate differed from batch to batch.${beside}`
      : `${measured} within batches there is an excess, which all shots together do not show. One as large ${often} if trials were independent.${beside}`;
  }
  // An excess that order explains, wherever it would else have been told as one.
  if (order && insideBatches(order) && (dispersion.value > 1 || excessShown))
    return `${measured} but inside batches too the rate changed, for neighbouring shots resemble each other (correlation ${formatNumber(order.correlation, 2)}; so large a one ${sayHowOften(order.p, surest)} if their order meant nothing). From one shot to the next the variance is ${sayInterval(order.dispersion, 3)} times the ceiling: that shows no excess beside the drift.`;
  return excessShown
    ? `${measured} within batches the counts neither rule out independent trials nor exclude an excess that matters, so how much of the excess is drift stays open.`
    : `${measured} within batches the counts neither rule out independent trials nor exclude an excess that matters.`;
}
