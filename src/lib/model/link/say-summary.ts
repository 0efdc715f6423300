import { formatCount } from '../format-number';
import { TESTS } from '../labels';
import { sayInterval } from '../say-interval';
import { LEAST_SHOTS_FOR_LAW, LEAST_TO_HIDE } from './hides-counts';
import type { Summary } from './summary';

/** How far the best law lies from the counts; '' where that is kept back with them. */
export const saySummaryDistance = ({ fit }: Summary): string =>
  fit.divergenceInterval
    ? `The best independent-trial law lies ${sayInterval(fit.divergenceInterval, 2)} nats a shot from the counts, chance taken off.`
    : '';

export const sayWithheldLaw = `The law and its divergence are kept back: with fewer than ${formatCount(LEAST_SHOTS_FOR_LAW)} shots or ${LEAST_TO_HIDE} different counts they tell too much of the counts.`;

/** The tests that did not run, each with its reason; '' when all did. */
export const sayNotRun = ({ notRun }: Summary): string =>
  notRun.map(({ id, reason }) => `Not run: ${TESTS[id]}. ${reason}`).join(' ');
