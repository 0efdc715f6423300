import { engineVersion } from '../engine-version';
import { BadInput } from '../types';
import { commonCause } from './common-cause';
import { correlationByDistance } from './correlation-by-distance';
import { correlationInterval } from './correlation-interval';
import { countTogether } from './count-together';
import { pairInCounts } from './pair-in-counts';
import { pairPower } from './pair-power';
import { pairTests, type PairTest } from './pair-tests';
import { siteColumns } from './site-columns';
import { siteCounts } from './site-counts';
import type { CountMoments, SitesInput, SitesOptions, SitesReport } from './sites-types';
import { sitesWords } from './sites-words';

/** Sites of one map at most: all 8128 pairs are kept in the document. */
export const maxMapSites = 128;

/** Correlation that the map's power is told for. */
const told = 0.05;

/**
 * Everything that is told of site-resolved shots, as one plain document: every pair with its interval and what is left of
 * its surprise among all pairs, correlation by distance, whether all sites move together, and what the counts alone could
 * show. The same input gives the same bytes; nothing is drawn at random.
 *
 * @throws BadInput for fewer than 2 shots or sites, more than 128 sites, or α outside 0 … 1
 */
export function sitesReport({ names, shots }: SitesInput, options: SitesOptions): SitesReport {
  const { geometry, alpha, seek } = options;
  const sites = names.length;
  if (sites < 2) throw new BadInput('A map of sites takes two sites or more.');
  if (sites > maxMapSites)
    throw new BadInput(`There are ${sites} sites; a map takes ${maxMapSites} at most. Give a part of them.`);
  if (shots.length < 2) throw new BadInput('A map of sites takes two shots or more.');
  if (geometry === 'ring' && sites < 3) throw new BadInput('A ring takes three sites or more.');
  if (!(alpha > 0 && alpha < 1)) throw new BadInput('The level α lies between 0 and 1.');
  const excited = siteColumns(shots, sites).map((column) => countTogether(column, column));
  const rate = (site: number) => excited[site] / shots.length;
  const tests = pairTests(shots, sites, geometry, seek);
  const common = commonCause(tests, shots.length, alpha);
  const power = pairPower(told, {
    sites,
    shots: shots.length,
    geometry,
    alpha,
    seek,
    rate: middleOf(excited) / shots.length
  });
  const report = {
    format: 'severalty.sites/1' as const,
    engineVersion,
    geometry,
    alpha,
    seek,
    names,
    shots: shots.length,
    excited,
    counts: {
      sites: momentsOf(siteCounts(shots, sites, 'sites').shots, sites),
      kinks:
        geometry === 'ring'
          ? momentsOf(siteCounts(shots, sites, 'ring-bonds').shots, sites)
          : momentsOf(siteCounts(shots, sites, 'open-bonds').shots, sites - 1)
    },
    pairs: tests.map((test) => {
      const { first, second, distance, together, correlation, p, pHolm, pFalseShare } = test;
      const ends = correlationInterval(correlation, [rate(first), rate(second)], shots.length);
      const [low, high] = [ends?.low ?? null, ends?.high ?? null];
      return { first, second, distance, together, correlation, low, high, p, pHolm, pFalseShare };
    }),
    byDistance: correlationByDistance(shots, sites, geometry),
    common,
    power,
    inCounts: inCounts(
      tests,
      alpha,
      excited.map((_, site) => rate(site)),
      shots.length
    )
  };
  return { ...report, ...sitesWords(report) };
}

/** The middle one of the numbers, the upper of two. */
const middleOf = (numbers: number[]): number => [...numbers].sort((a, b) => a - b)[numbers.length >> 1];

function momentsOf(counts: ArrayLike<number>, trials: number): CountMoments {
  const list = Array.from(counts);
  const mean = list.reduce((sum, one) => sum + one, 0) / list.length;
  const variance = list.reduce((sum, one) => sum + (one - mean) ** 2, 0) / (list.length - 1);
  return { mean, variance, trials };
}

/** Of the strongest pair that was found; else of one of the size that power is told for, between sites of the middle rate. */
function inCounts(tests: PairTest[], alpha: number, rates: number[], shots: number): SitesReport['inCounts'] {
  const found = tests.filter(({ pHolm }) => pHolm <= alpha);
  const size = ({ correlation }: PairTest) => Math.abs(correlation ?? 0);
  const strongest = found.reduce<PairTest | null>(
    (best, pair) => (best && size(best) >= size(pair) ? best : pair),
    null
  );
  const middle = middleOf(rates);
  const correlation = Number((strongest?.correlation ?? told).toPrecision(2));
  const pair: [number, number] = strongest
    ? [rates[strongest.first], rates[strongest.second]]
    : [middle, middle];
  return {
    correlation,
    ...pairInCounts({ correlation, pair, rates, shots, found: strongest !== null })
  };
}
