import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { chainMoments } from '../misread/chain-moments';
import type { DiagnoseOptions } from '../types';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';

/** (1 − 2ε)² = 2/3: beyond, the variance is no longer concave in the kinks, and its ceiling only bounded. */
export const largestRate = 0.0917;
/** More bonds than this would take minutes to refit. */
export const mostBonds = 1000;

/** The rate allowed for, or why none is. */
export type MisreadUse = { applies: true; rate: number } | { applies: false; reason: string | null };

/**
 * Whether a stated misread rate can be allowed for in every test: kinks on the bonds of an open chain of known length,
 * and a rate that the mean count does not refute. Otherwise the reason, as a sentence for the cautions; null when no rate
 * was stated.
 */
export function misreadApplies(options: DiagnoseOptions, counts: FitData): MisreadUse {
  const { misread, geometry, unit, trials } = options;
  if (!misread) return { applies: false, reason: null };
  const stated = `A misread rate of ${formatPercent(misread)} was stated.`;
  const no = (why: string) => ({ applies: false as const, reason: `${stated} ${why}` });
  if (geometry === 'sites') {
    return no(
      'Sites misread one by one leave their count a sum of independent trials, so the tests hold as they stand.'
    );
  }
  const without = 'so the tests here are against laws without misreads.';
  if (geometry === 'ring-bonds' || unit === 'pair') {
    return no(`For kinks on a ring, or counted in pairs, it is written down but not allowed for, ${without}`);
  }
  if (trials === null) return no(`Without the number of bonds it cannot be allowed for, ${without}`);
  if (trials < 2 || trials > mostBonds) {
    return no(`It is allowed for on chains of 2 to ${formatCount(mostBonds)} bonds, ${without}`);
  }
  if (misread > largestRate) {
    return no(`Above ${formatPercent(largestRate, 3)} it is written down but not allowed for, ${without}`);
  }
  const { mean } = sampleMoments(counts);
  const toggled = trials * 2 * misread * (1 - misread);
  // Kinks only add to what misreads alone show (or, mirrored, to what they hide), so five standard errors below that refute the rate.
  const alone = chainMoments([{ p: 0, trials }], misread);
  if (Math.min(mean, trials - mean) < toggled - 5 * Math.sqrt(alone.variance / counts.total)) {
    return no(
      `It cannot be right: misreads alone would show ${formatNumber(toggled, 3)} kinks a shot, and ${formatNumber(mean, 3)} were read. It is not allowed for, ${without}`
    );
  }
  return { applies: true, rate: misread };
}
