import type { Diagnosis } from '$lib/stats/types';

/** Lists of points that a chart draws. */
export type Drawn = 'distribution' | 'rate' | 'tails';

/** The document with the lists of points that nothing draws left empty, so that a page carries no more than it shows. */
export const keepDrawn = (diagnosis: Diagnosis, drawn: readonly Drawn[]): Diagnosis => ({
  ...diagnosis,
  distribution: drawn.includes('distribution') ? diagnosis.distribution : [],
  rate: { ...diagnosis.rate, points: drawn.includes('rate') ? diagnosis.rate.points : [] },
  tails: { ...diagnosis.tails, points: drawn.includes('tails') ? diagnosis.tails.points : [] }
});
