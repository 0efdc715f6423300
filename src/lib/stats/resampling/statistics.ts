import type { FitData } from '../fit/fit-data';
import type { Window } from '../laws/window';
import type { TestId } from '../types';
import { cells } from './cells';
import { emptyExcess } from './empty-excess';
import { familyMoments } from './fitted-law';
import { isReadChain } from '../misread/read-chain';
import { parityExcess, parityNeeds } from './parity-excess';
import type { Refitted } from './refitted';
import { tailExcess } from './tail-excess';

/** A statistic of a histogram and its own best law; large values speak against independent trials. */
export interface Statistic {
  of(histogram: Refitted): number;
  /**
   * G² that a law must leave of this histogram for `of` to reach `bar`; the law may leave more and `of` still not reach
   * it. For nearly all it is bar²: merging cells never adds to a deviance (the data-processing inequality), and a root
   * of the deviance of a tail, or of the likelihood that free empty shots gain, is one part of the whole.
   */
  needs(drawn: FitData, bar: number): number;
  /** Whether it is the root of a deviance: never below 0, and blurred by the root of what the deviance is blurred by. */
  root: boolean;
}

/** The low tail of the shots with n ≥ 1: not a test of its own, but evidence for or against coarsening. */
export const lowTailOfTheRest = 'low tail without empty shots';
export type StatisticId = TestId | typeof lowTailOfTheRest;

/** Statistics that this histogram allows, and the tests it does not, with the reason. */
export interface ChosenStatistics {
  statistics: Map<StatisticId, Statistic>;
  notRun: { id: TestId; reason: string }[];
}

/** One line a test against the fitted law. Limits of the tails are fixed here, by the observed fit. */
export function chooseStatistics(observed: Refitted): ChosenStatistics {
  const { data, law } = observed;
  const { mean, variance } = familyMoments(law);
  const spread = Math.sqrt(variance);
  const statistics: ChosenStatistics['statistics'] = new Map();
  const notRun: ChosenStatistics['notRun'] = [];
  const high = Math.floor(mean + spread) + 1;
  const low = Math.ceil(mean - spread) - 1;
  const use = (id: StatisticId, statistic: Statistic, reason: string | null) => {
    if (reason === null) statistics.set(id, statistic);
    else if (id !== lowTailOfTheRest) notRun.push({ id, reason });
  };
  const oneCount = spread > 0 ? null : 'Every shot had the same count.';
  const gSquared = ({ data: { total }, divergence }: Refitted) => 2 * total * divergence;
  use('fit', { of: gSquared, needs: (_, bar) => bar, root: false }, oneCount);
  use(
    'high-tail',
    whole('high', high),
    oneCount ??
      (high > (data.trials ?? Infinity)
        ? none('above')
        : high > (data.lump?.from ?? Infinity)
          ? lumps('closing', 'high')
          : null)
  );
  use(
    'low-tail',
    whole('low', low),
    oneCount ?? (low < 0 ? none('below') : low < (data.below?.to ?? 0) ? lumps('opening', 'low') : null)
  );
  use(
    'parity',
    { of: parityExcess, needs: parityNeeds, root: false },
    oneCount ??
      (isReadChain(law) && law.ring
        ? 'Round a ring every count is even, misread or not, in the law that is tested.'
        : data.lump || data.below
          ? `The ${data.lump ? 'closing' : 'opening'} row lumps even and odd counts together.`
          : null)
  );
  use('empty-shots', { of: emptyExcess, needs: square, root: true }, noEmpty(observed));
  const rest = observed.rest();
  use(lowTailOfTheRest, ofTheRest(low), rest && low >= rest.data.first ? null : 'nothing there');
  return { statistics, notRun };
}

function none(side: string): string {
  return `No possible count lies more than one standard deviation ${side} the mean.`;
}

function lumps(row: 'closing' | 'opening', tail: 'high' | 'low'): string {
  return `The ${row} row lumps the counts of the ${tail} tail with counts nearer the mean.`;
}

function noEmpty(observed: Refitted): string | null {
  if (observed.data.below) return 'The opening row lumps empty shots with others.';
  const rest = observed.rest();
  if (!rest) return 'No shot was empty, or every shot was.';
  let different = rest.data.lump ? 1 : 0;
  for (const shots of rest.data.shots) if (shots > 0) different++;
  return different > 1 ? null : 'The other shots all had one count, which tells nothing about empty ones.';
}

const square = (_: FitData, bar: number) => (bar > 0 ? bar * bar : 0);

function whole(side: 'high' | 'low', limit: number): Statistic {
  return { of: ({ data, fit }) => tail(data, fit.window, side, limit), needs: square, root: true };
}

function ofTheRest(limit: number): Statistic {
  const of = (histogram: Refitted) => {
    const rest = histogram.rest();
    return rest ? tail(rest.data, rest.fit.window, 'low', limit) : 0;
  };
  return { of, needs: square, root: true };
}

function tail(data: FitData, window: Window, side: 'high' | 'low', limit: number): number {
  const { law, below, above } = cells(data, window);
  const { lump, below: opening } = data;
  if (!lump && !opening)
    return tailExcess(data.shots, law, data.total, side === 'low' ? below : above, side, limit - data.first);
  // A lump is one more cell, at the count nearest to the others; nothing lies beyond it.
  const beyond = side === 'low' ? (opening ? 0 : below) : lump ? 0 : above;
  const before = opening ? 1 : 0;
  const shots = framed(data.shots, opening?.shots, lump?.shots);
  const fitted = framed(law, opening ? below : undefined, lump ? above : undefined);
  return tailExcess(shots, fitted, data.total, beyond, side, limit - data.first + before);
}

/** The values with one more before and after, where there is one. */
function framed(values: Float64Array, before: number | undefined, after: number | undefined): Float64Array {
  const start = before === undefined ? 0 : 1;
  const out = new Float64Array(values.length + start + (after === undefined ? 0 : 1));
  if (before !== undefined) out[0] = before;
  out.set(values, start);
  if (after !== undefined) out[out.length - 1] = after;
  return out;
}
