import { normalQuantile } from '../numerics/normal-quantile';

/**
 * Smallest true factor, less 1, that a one-sided test of ln D sees with 80 % power: exp((z_{1−a} + z_{0.8})·error) − 1.
 * The error is taken as that of the data, which a true excess would enlarge a little.
 *
 * @param error standard error of ln D, or of a difference of two
 * @param level of the test, already divided by the number of tests
 */
export function smallestSeen(error: number, level: number): number {
  return Math.expm1((-normalQuantile(level) + normalQuantile(0.8)) * error);
}
