import type { Verdict } from '$lib/stats/types';

/** What stands under the flags when none is raised. */
export const sayNoFlags = (verdict: Verdict): string =>
  verdict === 'ruled-out'
    ? 'No single cause: the counts are unlike any independent trials, but in none of the ways that have a name here. Look at the residuals above.'
    : 'Nothing in particular: no test singles out a departure from independent trials.';
