import type { FitData } from '../fit/fit-data';
import { chainFit } from '../misread/chain-fit';
import type { ReadChain } from '../misread/read-chain';
import { keptEqual } from './kept-equal';
import type { KeptCounts } from './truncated-law';
import { sampleMoments } from '../fit/sample-moments';
import { dropsEmptyOnly, fitWithoutEmpty } from './without-empty';

/** The best law found for counts so cut, and the best of equal trials; each with its conditional log-likelihood, nats. */
export interface TruncatedFit {
  /** Before the cut, as a chain without misreads. */
  chain: ReadChain;
  value: number;
  even: { chain: ReadChain; value: number };
  /** In words. */
  how: string;
}

/**
 * Best law found for counts of independent trials of which only those from `kept.from` to `kept.to` were kept: the
 * likelihood is Σ h_n ln f_n − S ln P(kept).
 *
 * Where only empty shots were dropped it is searched for among all laws (see dropsEmptyOnly). Else the search is that of
 * chains without misreads (see chainFit): up to six levels, their sizes in a few dozen trials. A cut that leaves two or
 * three counts leaves the levels nearly open; the likelihood is then flat, and any of them fits.
 *
 * @param data trials = N known; every count within `kept`; nothing else set aside
 * @throws RangeError when N is unknown or a count lies outside
 */
export function truncatedFit(data: FitData, kept: KeptCounts): TruncatedFit {
  const { trials } = data;
  const last = data.first + data.shots.length - 1;
  if (trials === null) throw new RangeError('the number of trials is unknown');
  if (data.first < kept.from || last > kept.to)
    throw new RangeError(`counts ${data.first} … ${last} outside`);
  if (dropsEmptyOnly(kept, trials)) {
    const { starts, agreeing, ...found } = fitWithoutEmpty(data, kept);
    const how = `from ${starts} starts, ${agreeing} of which ended within 0.01 nats of the best, with structural moves until none gains`;
    return { ...found, even: equalWithoutEmpty(data, kept), how };
  }
  const { chain, value, even } = chainFit(data, 0, kept);
  const cut = { rate: 0, kept };
  return {
    chain: { ...chain, ...cut },
    value,
    even: { chain: { ...even.chain, ...cut }, value: even.value },
    how: 'up to six probabilities, equal trials, two levels of many sizes, and halves of these, each by scoring'
  };
}

/** Equal trials so cut whose mean is that of the counts: their likelihood is greatest there. */
function equalWithoutEmpty(data: FitData, kept: KeptCounts): TruncatedFit['even'] {
  const trials = data.trials!;
  const { first, values } = keptEqual(trials, kept, sampleMoments(data).mean);
  // f_2/f_1 = (N − 1)/2 · p/(1 − p).
  const odds = (2 * values[1]) / (values[0] * (trials - 1));
  let value = 0;
  for (let i = 0; i < data.shots.length; i++)
    if (data.shots[i] > 0) value += data.shots[i] * Math.log(values[data.first + i - first]);
  const p = Number.isFinite(odds) ? odds / (1 + odds) : 1;
  return { chain: { p: [p], runs: [{ level: 0, trials }], rate: 0, kept }, value };
}
