import { formatCount } from '../format-number';

/**
 * How many shots would tell two explanations apart, as a sentence, and that it is for these two alone; '' where no number
 * of shots would.
 */
export const sayShotsInAll = (shots: number | null): string =>
  shots === null ? '' : `By the counts alone, for these two: about ${formatCount(shots)} shots in all.`;

/** The same for the first of the list over every other story in it. */
export const sayShotsToLead = (name: string, shots: number | null): string =>
  shots === null
    ? ''
    : `If ${name} is what it is, as fitted, it leads every other story of the list by the counts alone in four of five repeats of about ${formatCount(shots)} shots in all.`;
