import type { PublishedCumulants } from './published-cumulants';

/**
 * Printed cumulants without a third or fourth that has no error beside it, where mean and variance have theirs. How far
 * shots scatter is told for the others, and a half unit of a last digit would stand beside their standard errors as if it
 * were one: a variance tens of errors over its ceiling was then not ruled out any more. Where mean or variance lack their
 * error nothing is left out, since nothing of chance can be said anyway.
 */
export function withErrors(printed: PublishedCumulants): PublishedCumulants {
  const { mean, variance, third, fourth } = printed;
  if (mean.rounded || variance.rounded) return printed;
  if (third?.rounded) return { ...printed, third: null, fourth: null };
  return fourth?.rounded ? { ...printed, fourth: null } : printed;
}
