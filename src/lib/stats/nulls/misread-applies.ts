import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { largestRate, misreadsAlone } from '../misread/largest-rate';
import { rateLimits, type RateLimits } from '../rate-interval/rate-limits';
import type { DiagnoseOptions } from '../types';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { sayRate } from '../words/say-rate';

/** (1 − 2ε)² = 2/3: beyond, the variance is no longer concave in the kinks, and its ceiling only bounded. */
export const mostRate = 0.0917;
/** More bonds than this would take minutes to refit. */
export const mostBonds = 1000;

/** The rate allowed for, its limits where it has an uncertainty, or why none is allowed for. */
export type MisreadUse =
  | { applies: true; rate: number; limits?: RateLimits }
  /** `largest`: the rate that the counts allow at most, where the stated one is over it. */
  | { applies: false; reason: string | null; largest?: number };

/**
 * Whether a stated misread rate can be allowed for in every test: single kinks on the bonds of an open chain of known
 * length, or of a ring without odd counts, and a rate that the mean count does not refute. Otherwise the reason, as a sentence for the cautions; null when no rate
 * was stated. A rate that no trials can have is told whatever the geometry, with the largest that the counts allow.
 */
export function misreadApplies(options: DiagnoseOptions, counts: FitData): MisreadUse {
  const { misread, geometry, unit, trials } = options;
  if (!misread) return { applies: false, reason: null };
  const uncertainty = options.misreadUncertainty ?? 0;
  const known = uncertainty > 0 ? `, give or take ${sayRate(uncertainty)},` : '';
  const stated = `A misread rate of ${sayRate(misread)}${known} was stated.`;
  const no = (why: string) => ({ applies: false as const, reason: `${stated} ${why}` });
  const without = 'so the tests here are against laws without misreads.';
  // A lump hides how large the mean is.
  const mean = sampleMoments(counts).mean * (unit === 'pair' ? 2 : 1);
  const largest = trials === null || counts.lump ? 0.5 : largestRate(mean, trials, counts.total, geometry);
  const limits = rateLimits(misread, uncertainty, largest, options.alpha);
  if (limits === null) {
    const alone = misreadsAlone(misread, trials!, geometry).mean;
    const things = geometry === 'sites' ? 'defects' : 'kinks';
    const seen =
      mean > trials! / 2
        ? `misreads would hide ${formatNumber(alone, 3)} of ${formatCount(trials)} ${things} a shot at the least, and ${formatNumber(trials! - mean, 3)} are missing`
        : `misreads alone would show ${formatNumber(alone, 3)} ${things} a shot, and ${formatNumber(mean, 3)} were read`;
    const why = `It cannot be right: ${seen}. These counts allow ${formatPercent(largest, 3)} at most.`;
    return { ...no(geometry === 'sites' ? why : `${why} It is not allowed for, ${without}`), largest };
  }
  if (geometry === 'sites') {
    return no(
      'Sites misread one by one leave their count a sum of independent trials, so the tests hold as they stand.'
    );
  }
  const ring = geometry === 'ring-bonds';
  if (unit === 'pair') {
    return no(
      ring
        ? `In pairs it is written down but not allowed for, ${without} What misreads do to a pair depends on how far apart its two kinks lie. Counted singly, kinks that form independently round the ring are tested with the rate allowed for.`
        : `For kinks counted in pairs on an open chain it is written down but not allowed for, ${without}`
    );
  }
  const odd = ring ? oddShots(counts) : 0;
  if (odd > 0) {
    return no(
      `Round a ring a misread site toggles two bonds and keeps counts even, so no rate gives the ${odd === 1 ? 'odd count' : `${formatCount(odd)} odd counts`} seen: a site was lost, a bond missed, or the file is wrong. Read such shots again or set them aside, and the rate can be allowed for. It is not, ${without}`
    );
  }
  if (trials === null) return no(`Without the number of bonds it cannot be allowed for, ${without}`);
  if (ring && trials % 2 === 1 && mean > trials / 2) {
    return no(
      `On a ring of an odd number of bonds it is allowed for where at most half of them are read as kinks, ${without}`
    );
  }
  const fewest = ring ? 3 : 2;
  if (trials < fewest || trials > mostBonds) {
    return no(
      `It is allowed for on ${ring ? 'rings' : 'chains'} of ${fewest} to ${formatCount(mostBonds)} bonds, ${without}`
    );
  }
  if (limits.high > mostRate) {
    const reach = uncertainty > 0 ? ` With its uncertainty it may be ${formatPercent(limits.high, 3)}.` : '';
    return no(
      `Above ${formatPercent(mostRate, 3)} it is written down but not allowed for, ${without}${reach}`
    );
  }
  return uncertainty > 0 ? { applies: true, rate: limits.rate, limits } : { applies: true, rate: misread };
}

/** Shots with an odd count in a row of its own. */
function oddShots({ first, shots }: FitData): number {
  return shots.reduce((sum, here, i) => ((first + i) % 2 === 1 ? sum + here : sum), 0);
}
