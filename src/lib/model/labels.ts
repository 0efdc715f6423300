export { explanationNames as EXPLANATIONS } from '$lib/stats/explanations/explanation-names';
import type { FlagId, Geometry, ReferenceId, TestId, TestResult, Unit, Verdict } from '$lib/stats/types';

/** Names of the parts of a diagnosis, the same on the page, in print and at the command line. */
export const VERDICTS: Record<Verdict, string> = {
  compatible: 'Compatible with independent trials',
  'ruled-out': 'Independent trials ruled out',
  undecided: 'Undecided'
};

export const TESTS: Record<TestId, string> = {
  ceiling: 'variance over the ceiling',
  fit: 'fit as a whole',
  'high-tail': 'high tail',
  'low-tail': 'low tail',
  parity: 'even and odd counts',
  'empty-shots': 'empty shots',
  batches: 'between batches',
  order: 'order of the shots'
};

export const SOURCES: Record<TestResult['source'], string> = {
  exact: 'exact',
  resampled: 'resampled',
  permuted: 'permuted',
  limit: 'limit law'
};

export const FLAGS: Record<FlagId, string> = {
  bunching: 'Bunching',
  bursts: 'Bursts',
  coarsening: 'Coarsening',
  pairing: 'Pairing',
  'dead-shots': 'Dead shots',
  drift: 'Drift',
  misreads: 'Misreads',
  regular: 'Regular'
};

export const REFERENCES: Record<ReferenceId, string> = {
  'equal-trials': 'equal trials (binomial)',
  'rare-events': 'rare events (Poisson)',
  gaussian: 'Gaussian of the same moments',
  'landau-zener': 'Landau–Zener modes',
  supplied: 'the law you supplied'
};

export const GEOMETRIES: Record<Geometry, string> = {
  sites: 'sites, each by itself',
  'open-bonds': 'bonds of an open chain',
  'ring-bonds': 'bonds of a ring'
};

export const UNITS: Record<Unit, string> = {
  defect: 'single defects',
  pair: 'pairs of defects'
};
