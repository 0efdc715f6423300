import type { Diagnosis } from '$lib/stats/types';

/**
 * Below these a link that keeps the counts back is not made. With few shots or few different counts the rounded
 * moments leave so few histograms that all can be tried. Above them it only takes longer: nothing here is proof.
 */
export const LEAST_TO_HIDE = 8;
export const LEAST_SHOTS_TO_HIDE = 1000;

/** Why no link was made, for the person who asked for it. */
export const TOO_FEW_TO_HIDE = `With fewer than ${LEAST_SHOTS_TO_HIDE} shots or ${LEAST_TO_HIDE} different counts, what is left of a report gives its counts away.`;

/**
 * Third and fourth cumulant, divergence and law are shown from this many shots on. With 2000 shots and nine counts
 * the histogram carries about 45 bits beyond its number of shots, and four cumulants at three digits about 40.
 */
export const LEAST_SHOTS_FOR_LAW = 10_000;

type Counted = { data: Pick<Diagnosis['data'], 'counts' | 'lump' | 'below' | 'shots'> };

/** How many different counts were seen, a row that lumps counts being one. */
export function differentCounts({ data }: Counted): number {
  return data.counts.filter(([, shots]) => shots > 0).length + (data.lump ? 1 : 0) + (data.below ? 1 : 0);
}

/** Whether a link may keep the counts of this report back. */
export function hidesCounts(diagnosis: Counted): boolean {
  return diagnosis.data.shots >= LEAST_SHOTS_TO_HIDE && differentCounts(diagnosis) >= LEAST_TO_HIDE;
}
