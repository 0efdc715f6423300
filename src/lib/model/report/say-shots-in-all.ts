import { formatCount } from '../format-number';

/** How many shots would tell two explanations apart, as a sentence; '' where no number of shots would. */
export const sayShotsInAll = (shots: number | null): string =>
  shots === null ? '' : `By the counts alone: about ${formatCount(shots)} shots in all.`;
