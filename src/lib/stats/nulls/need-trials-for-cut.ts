import { BadInput } from '../types';
import { mostBonds } from './misread-applies';

/**
 * Refuses a cut of the counts where laws so cut cannot be fitted: without the number of trials, or with too many.
 *
 * @throws BadInput, in words
 */
export function needTrialsForCut(trials: number | null): asserts trials is number {
  if (trials === null)
    throw new BadInput('A cut can be allowed for only where the number of trials is known.');
  if (trials > mostBonds) throw new BadInput(`A cut can be allowed for only up to ${mostBonds} trials.`);
}
