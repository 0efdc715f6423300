import type { Summary } from '../link/summary';
import type { Quotable } from './quotable';

/**
 * What there is to quote of a report whose counts are kept back: rounded numbers, and neither digest, seed, number of
 * resamples nor certificate. Nothing is told that the summary does not tell.
 */
export function quotableOfSummary(summary: Summary): Quotable {
  const { answer, data, moments, nuisances, fit, tests, notRun, flags, engine } = summary;
  return {
    answer,
    data: {
      ...data,
      digest: null,
      misreadApplied: nuisances?.misread.applied ?? false,
      lump: data.lumped ? { from: null } : null,
      opening: data.opening ? { to: null } : null
    },
    moments,
    fit: { divergence: fit.divergenceInterval, gSquared: null, certified: null, found: null, floor: null },
    tests: tests.map(({ id, p, pAdjusted, source, limits }) => ({
      id,
      p,
      pAdjusted,
      source,
      // Not to be told from rounded numbers, so the limits of p are quoted instead.
      atSmallest: false,
      resamples: null,
      stoppedEarly: false,
      limits: source === 'exact' || source === 'limit' ? null : limits
    })),
    notRun,
    certificate: null,
    flags,
    explanations: null,
    engine: { ...engine, seed: null, resamples: null }
  };
}
