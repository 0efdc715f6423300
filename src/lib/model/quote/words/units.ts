import type { Quotable } from '../quotable';

type Counted = Pick<Quotable, 'data'>;

/** What is counted, one of them and many. */
export const thing = ({ data }: Counted): string => (data.unit === 'pair' ? 'pair' : 'defect');

/** Trials in a shot in the unit that is tested: half of them for pairs. Null when unknown. */
export const testedTrials = ({ data }: Counted): number | null =>
  data.trials === null ? null : data.unit === 'pair' ? data.trials / 2 : data.trials;
