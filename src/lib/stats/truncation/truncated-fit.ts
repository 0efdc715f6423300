import type { FitData } from '../fit/fit-data';
import { chainFit } from '../misread/chain-fit';
import { readLevels } from '../misread/read-chain';
import type { Law } from '../types';
import type { KeptCounts } from './truncated-law';

/**
 * Best law found for counts of independent trials of which only those from `kept.from` to `kept.to` were kept: the
 * likelihood is Σ h_n ln f_n − S ln P(kept).
 *
 * The search is that of chains without misreads (see chainFit): up to three levels, their sizes in a few dozen trials.
 * A cut that leaves two or three counts leaves the levels nearly open; the likelihood is then flat, and any of them fits.
 *
 * @param data trials = N known; every count within `kept`; nothing else set aside
 * @returns the law before the cut, and the conditional log-likelihood in nats
 * @throws RangeError when N is unknown or a count lies outside
 */
export function truncatedFit(data: FitData, kept: KeptCounts): { law: Law; logLikelihood: number } {
  const last = data.first + data.shots.length - 1;
  if (data.trials === null) throw new RangeError('the number of trials is unknown');
  if (data.first < kept.from || last > kept.to)
    throw new RangeError(`counts ${data.first} … ${last} outside`);
  const { chain, value } = chainFit(data, 0, kept);
  return { law: { levels: readLevels(chain), poissonPart: 0 }, logLikelihood: value };
}
