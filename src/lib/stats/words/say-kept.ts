import { formatCount } from './format-number';

/** "counts from 1 to 4", or "counts of 1 and more". */
export const sayKept = ({ from, to }: { from: number; to: number | null }): string =>
  to === null
    ? `counts of ${formatCount(from)} and more`
    : `counts from ${formatCount(from)} to ${formatCount(to)}`;
