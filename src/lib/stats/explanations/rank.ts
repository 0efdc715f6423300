import type { Unranked } from './tell-story';
import type { Explanation } from './types';

/** Best AIC first, with the distance from it and Akaike weights exp(−behind/2)/Σ. */
export function rank(told: Unranked[]): Explanation[] {
  const least = Math.min(...told.map(({ aic }) => aic));
  const ranked = told
    .map((one) => ({ ...one, behind: one.aic - least, share: Math.exp(-(one.aic - least) / 2) }))
    .sort((a, b) => a.aic - b.aic);
  const sum = ranked.reduce((total, { share }) => total + share, 0);
  return ranked.map(({ share, ...one }) => ({ ...one, weight: share / sum }));
}
