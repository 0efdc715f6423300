import type { TestId } from '$lib/stats/types';
import { REFERENCES, TESTS } from '../labels';
import type { TermId } from './terms';

/** Titles of columns, rows and facts of a report, and the term that each is about. */
const TITLES: Record<string, TermId> = {
  // Columns of tables.
  count: 'count',
  shots: 'shot',
  low: 'interval',
  high: 'interval',
  density: 'density',
  'best law': 'best-law',
  'seen rate': 'rate-function',
  limit: 'large-deviation-limit',
  Gaussian: 'gaussian-curve',
  tail: 'tail',
  Chernoff: 'chernoff',
  'Chernoff, mean alone': 'mean-chernoff',
  Hoeffding: 'hoeffding',
  'log-likelihood': 'likelihood',
  'nats a shot': 'divergence',
  AIC: 'aic',
  part: 'levels',
  cumulant: 'cumulants',
  p: 'p-value',
  'p, all tests': 'holm',
  'smallest p': 'smallest-p',
  from: 'resample',
  resamples: 'resample',
  // Names of rows.
  'κ₁, mean': 'cumulants',
  'κ₂, variance': 'cumulants',
  'κ₃': 'cumulants',
  'κ₄': 'cumulants',
  'κ₂/κ₁, Fano factor': 'fano',
  variance: 'cumulants',
  ceiling: 'ceiling',
  'variance over ceiling': 'dispersion',
  'excess that matters': 'tolerance',
  'best independent-trial law': 'best-law',
  'rare events, mean count': 'poisson-part',
  [REFERENCES['equal-trials']]: 'reference-laws',
  [REFERENCES['rare-events']]: 'reference-laws',
  [REFERENCES.gaussian]: 'reference-laws',
  [REFERENCES['landau-zener']]: 'landau-zener',
  [REFERENCES.supplied]: 'reference-laws',
  // Facts.
  Shots: 'shot',
  'Trials in a shot, N': 'trials',
  'Counts seen': 'count',
  Unit: 'pair',
  'Counted on': 'geometry',
  'Counts kept': 'kept',
  'Chance to misread a site': 'misread-rate',
  'Order of the shots': 'test-order',
  Counts: 'digest',
  Seed: 'seed',
  'Resampled histograms': 'resample',
  'Level of the answer': 'alpha',
  'Excess that matters': 'tolerance',
  'Misread sites': 'misread-rate',
  'Ceiling as read': 'misread-ceiling',
  'Misread rate needed': 'needed-rate',
  'Largest misread rate': 'misread-rate',
  'Over the rate’s uncertainty': 'misread-rate',
  'Kinks along the chain': 'levels',
  Drift: 'test-order',
  'Within batches': 'within-batches',
  'Change of the mean': 'change-of-mean',
  batch: 'within-batches',
  'lower limit': 'running-mean',
  'upper limit': 'running-mean',
  Pairs: 'pair',
  'Odd counts': 'pair',
  'Without empty shots': 'kept',
  'Lumped counts': 'lump',
  'N too small': 'critical-trials',
  'As N runs': 'critical-trials',
  N: 'trials'
};

/** Titles that say all there is to say. */
export const PLAIN_TITLES: ReadonlySet<string> = new Set([
  'share',
  'how many',
  'probability of each, or mean',
  'law',
  'value',
  'quantity',
  'test',
  'statistic',
  'size',
  'trials',
  'Name',
  'Engine',
  'Post-selection',
  'first shot',
  'last shot',
  'mean',
  'inequality',
  'bound',
  'printed',
  'error',
  'nearest',
  'inside by, in errors',
  'off by, in errors',
  'standing'
]);

/** The term that a title of a report is about; null for one that has no note. */
export function termOfTitle(title: string): TermId | null {
  const test = Object.entries(TESTS).find(([, name]) => name === title);
  // Every test has a term: `tests.ts` is typed so. The terms themselves are a tenth of a page, and not loaded for this.
  if (test) return `test-${test[0] as TestId}`;
  return Object.hasOwn(TITLES, title) ? TITLES[title] : null;
}
