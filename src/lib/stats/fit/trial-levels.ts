import type { Law } from '../types';

/** A law during the search: levels strictly inside (0, 1), trials at 0 and 1 set apart, Poisson part γ. */
export interface TrialLevels {
  p: number[];
  trials: number[];
  /** Trials with p = 1. */
  ones: number;
  /** Trials with p = 0; Infinity when N is unknown. */
  zeros: number;
  poissonPart: number;
}

/** A copy that can be changed. Field by field: as a spread this was a twelfth of the time of a refit. */
export function copyLevels({ p, trials, ones, zeros, poissonPart }: TrialLevels): TrialLevels {
  return { p: p.slice(), trials: trials.slice(), ones, zeros, poissonPart };
}

/** The same law as it stands in the document: levels from high to low, the zeros last. */
export function toLaw(levels: TrialLevels): Law {
  const rows = levels.p.map((p, j) => ({ p, trials: levels.trials[j] }));
  if (levels.ones > 0) rows.push({ p: 1, trials: levels.ones });
  rows.sort((a, b) => b.p - a.p);
  if (levels.zeros > 0 && Number.isFinite(levels.zeros)) rows.push({ p: 0, trials: levels.zeros });
  return { levels: rows, poissonPart: levels.poissonPart };
}
