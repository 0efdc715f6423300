import type { FitData } from '../fit/fit-data';
import { saturated } from '../resampling/divergence';
import type { Reference, ReferenceId } from '../types';
import { equalTrials } from './equal-trials';
import { gaussian } from './gaussian';
import { landauZener } from './landau-zener';
import { lawLogLikelihood } from '../fit/law-log-likelihood';

/** References shown beside the best law, and those left out with the reason. */
export interface ReferenceLaws {
  references: Reference[];
  omitted: { id: ReferenceId; reason: string }[];
}

/**
 * Equal trials, rare events, Gaussian, Landau–Zener modes and a supplied law, each by the same likelihood.
 * AIC = 2·parameters − 2·log-likelihood; the supplied law has none.
 *
 * @param supplied one probability a trial, or null
 */
export function referenceLaws(data: FitData, supplied: number[] | null): ReferenceLaws {
  const out: ReferenceLaws = { references: [], omitted: [] };
  const ceilingOf = saturated(data);
  const add = (
    id: ReferenceId,
    logLikelihood: number,
    fitted: number,
    parameters: Record<string, number>
  ) => {
    if (!Number.isFinite(logLikelihood)) {
      out.omitted.push({ id, reason: 'It gives no probability to a count that was seen.' });
      return;
    }
    out.references.push({
      id,
      logLikelihood,
      divergence: Math.max(0, (ceilingOf - logLikelihood) / data.total),
      aic: 2 * fitted - 2 * logLikelihood,
      parameters
    });
  };
  if (data.trials !== null) {
    const equal = equalTrials(data, data.trials);
    add('equal-trials', equal.logLikelihood, 1, { p: equal.parameter });
  } else out.omitted.push({ id: 'equal-trials', reason: 'It needs the number of trials.' });
  const rare = equalTrials(data, null);
  add('rare-events', rare.logLikelihood, 1, { mean: rare.parameter });
  const normal = gaussian(data);
  if (normal) add('gaussian', normal.logLikelihood, 2, { mean: normal.mean, variance: normal.variance });
  else out.omitted.push({ id: 'gaussian', reason: 'Every shot had the same count, so there is no width.' });
  const modes = landauZener(data);
  if (modes) add('landau-zener', modes.logLikelihood, 1, { a: modes.a });
  else out.omitted.push({ id: 'landau-zener', reason: whyNoModes(data) });
  if (supplied) {
    const law = { levels: supplied.map((p) => ({ p, trials: 1 })), poissonPart: 0 };
    add('supplied', lawLogLikelihood(data, law), 0, {});
  } else out.omitted.push({ id: 'supplied', reason: 'No law was supplied.' });
  return out;
}

function whyNoModes(data: FitData): string {
  return data.trials === null
    ? 'It needs the number of modes as trials.'
    : 'No quench time within reach gives this mean, or the law would take too long to compute.';
}
