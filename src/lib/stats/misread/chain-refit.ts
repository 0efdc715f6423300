import type { FitData } from '../fit/fit-data';
import type { Refit } from '../fit/refit';
import type { Window } from '../laws/window';
import { chainClimb, type ChainClimb, type ChainProblem } from './chain-climb';
import { mostLevels, mostLevelsCut } from './chain-fit';
import type { Kept } from './chain-score';
import { chainSpace, type Chain, type ChainSpace } from './chain-space';
import { evenChain, twoLevels } from './chain-starts';
import { sampleMoments } from '../fit/sample-moments';
import { readWindow, type ReadChain } from './read-chain';

/** Nats to which a climb is made; G² varies by several between resamples. */
const enough = 2e-3;
/** Shares of the bonds that the more likely level is tried with. */
const shares = [0.06, 0.25, 0.5, 0.8];
/** Beyond this many bonds each climb takes long, and two lengths must do. */
const long = 200;

/** A refitted chain, in the form of a plain refit. */
export type ChainRefit = Omit<Refit, 'levels'> & { levels: ReadChain };

/**
 * The best chain of a resampled histogram, from the chain it was drawn from, from equal bonds, and from two levels in a
 * few lengths that have its mean and variance. What falls short makes the G² of a resample too large, and so p too
 * large: the safe side.
 *
 * @param space buffers to work in
 * @param settled a log-likelihood at which the search may end short of the best
 */
export function chainRefit(
  data: FitData,
  from: ReadChain,
  space: ChainSpace = chainSpace(data.trials!, from.kept ? mostLevelsCut : mostLevels),
  settled = Infinity
): ChainRefit {
  const { rate, ring } = from;
  const bonds = data.trials!;
  const moments = sampleMoments(data);
  const cut = from.kept ?? null;
  const kept = data.withoutEmpty ? { from: Math.max(1, cut?.from ?? 1), to: cut?.to ?? Infinity } : cut;
  const problem: ChainProblem = { space, data, rate, kept, ...(ring && { ring }) };
  let best = chainClimb(problem, { p: from.p, runs: from.runs }, enough, settled);
  const attempt = (start: Chain | null): number => {
    if (!start || best.value >= settled) return -Infinity;
    const found = chainClimb(problem, start, enough, settled);
    if (found.value > best.value) best = found;
    return found.value;
  };
  if (from.p.length > 1 || best.value === -Infinity) attempt(evenChain(bonds, moments.mean, rate, ring));
  const lengths = (bonds > long ? [0.25, 0.7] : shares).map((share) =>
    Math.min(bonds - 1, Math.max(1, Math.round(share * bonds)))
  );
  const values = lengths.map((many) => attempt(twoLevels(bonds, many, 1, moments, rate, ring)));
  const top = values.indexOf(Math.max(...values));
  if (bonds <= long && values[top] > -Infinity) {
    for (const stride of [bonds / 8, -bonds / 8]) {
      const many = lengths[top] + Math.round(stride);
      attempt(twoLevels(bonds, many, 1, moments, rate, ring));
    }
  }
  return asRefit(best, rate, cut, ring);
}

/** A climb's chain with its pmf. */
export function asRefit(
  { chain, value }: ChainClimb,
  rate: number,
  kept: Kept | null = null,
  ring = false
): ChainRefit {
  const levels = { ...chain, rate, ...(kept && { kept }), ...(ring && { ring }) };
  const window: Window = readWindow(levels, 1e-20, 1);
  return { levels, logLikelihood: value, window };
}
