import type { SweptPoint } from '$lib/stats/sweep/types';

/** Whether a dataset is in the window of a sweep; one that is, but has no errors to be fitted with, is left out. */
export const sayInWindow = ({ inWindow, cumulants }: Pick<SweptPoint, 'inWindow' | 'cumulants'>): string =>
  !inWindow ? 'no' : cumulants ? 'yes' : 'left out';
