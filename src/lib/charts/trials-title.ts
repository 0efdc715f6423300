import type { TrialsPart } from '$lib/stats/sensitivity/types';

/** What the chart of the variance over its ceiling against N shows, as its title. */
export function trialsTitle({ points }: TrialsPart): string {
  const [first] = points;
  if (points.every(({ standing }) => standing === first.standing))
    return first.standing === 'over'
      ? 'The variance is over its ceiling whatever the number of trials'
      : first.standing === 'within'
        ? 'No number of trials makes the variance an excess that matters'
        : 'The variance alone decides for no number of trials';
  return 'What the variance says depends on the number of trials';
}
