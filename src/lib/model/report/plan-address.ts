import type { Diagnosis } from '$lib/stats/types';

/** Fewest shots that the planner takes. */
const fewest = 20;

/**
 * The planner's address for an undecided result, with its numbers filled in: how many shots show an excess that
 * matters, and what these shots can show. null for every other result, and where there is no spread to plan with.
 */
export function planAddress({ answer, moments, data, engine }: Diagnosis): string | null {
  const mean = moments.mean.value;
  const trials = data.trials === null ? null : data.trials / (data.unit === 'pair' ? 2 : 1);
  if (answer.verdict !== 'undecided' || !mean) return null;
  if (trials !== null && (trials < 2 || mean >= trials || engine.tolerance >= trials - 1)) return null;
  const parts = [`mean=${Number(mean.toPrecision(4))}`];
  if (trials !== null) parts.push(`trials=${trials}`);
  parts.push(`size=${engine.tolerance}`);
  if (data.shots >= fewest) parts.push(`shots=${data.shots}`);
  parts.push(`alpha=${engine.alpha}`);
  return `/plan#${parts.join('&')}`;
}
