import { logChoose } from '../numerics/log-choose';
import { logFisherP } from './log-fisher-p';
import { logRiseP } from './log-rise-p';
import type { Seek } from './pair-tests';

/**
 * The chance that Fisher's exact test of a pair with correlation r has a p of at most `level`, upwards: both sites are
 * excited on the rounded S·rate of the shots, and the shots on which both are follow the noncentral hypergeometric law
 * of the odds ratio that r and the rate imply. 0 for a rate of 0 or 1, or one that allows no such correlation.
 *
 * Source: Fisher 1935, J. R. Statist. Soc. 98:39.
 */
export function foundChance(
  correlation: number,
  { rate, shots, level, seek }: { rate: number; shots: number; level: number; seek: Seek }
): number {
  const excited = Math.round(rate * shots);
  const both = rate * rate + correlation * rate * (1 - rate);
  const alone = rate - both;
  const neither = 1 - rate - alone;
  if (!(excited > 0 && excited < shots && alone > 0 && neither > 0)) return 0;
  const logOdds = Math.log((both * neither) / (alone * alone));
  const logWeight = (k: number) =>
    logChoose(excited, k) + logChoose(shots - excited, excited - k) + k * logOdds;
  const least = Math.max(0, 2 * excited - shots);
  const centre = Math.min(excited, Math.max(least, Math.round(both * shots)));
  const peak = logWeight(centre);
  const test = seek === 'rise' ? logRiseP : logFisherP;
  // The least number of shots that is found: p falls with it above the mean.
  let below = Math.floor((excited * excited) / shots);
  let found = excited + 1;
  while (found - below > 1) {
    const middle = Math.floor((found + below) / 2);
    if (test(middle, excited, excited, shots) <= Math.log(level)) found = middle;
    else below = middle;
  }
  let all = 0;
  let over = 0;
  const add = (k: number): boolean => {
    const weight = Math.exp(logWeight(k) - peak);
    all += weight;
    if (k >= found) over += weight;
    return weight > 1e-17;
  };
  for (let k = centre; k <= excited && add(k); k++);
  for (let k = centre - 1; k >= least && add(k); k--);
  return over / all;
}
