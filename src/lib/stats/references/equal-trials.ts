import type { FitData } from '../fit/fit-data';
import { climb } from '../fit/climb';
import { lawLogLikelihood } from '../fit/law-log-likelihood';
import { sampleMoments } from '../fit/sample-moments';
import { alike } from '../fit/starts';
import { toLaw } from '../fit/trial-levels';
import { workspace } from '../fit/workspace';

/**
 * Equal trials (binomial), or rare events (Poisson) when `trials` is null, fitted by likelihood.
 *
 * @returns log-likelihood in nats and the fitted value: p, or the Poisson mean. Without a lump that is the
 *   sample mean; with one, the censored likelihood is climbed.
 */
export function equalTrials(
  data: FitData,
  trials: number | null
): { logLikelihood: number; parameter: number } {
  const same = data.trials === trials ? data : { ...data, trials };
  const space = workspace(same);
  const found = climb(space, alike(trials, sampleMoments(data).mean), 1e-12);
  const { p, ones, poissonPart } = found.levels;
  // Counts so far out that the law underflows there: then there is no slope to climb, but still a logarithm.
  const value = found.value > -Infinity ? found.value : lawLogLikelihood(same, toLaw(found.levels));
  const parameter = trials === null ? poissonPart : p.length > 0 ? p[0] : ones > 0 ? 1 : 0;
  return { logLikelihood: value, parameter };
}
