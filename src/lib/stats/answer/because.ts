import type { Evidence } from '../flags/evidence';
import { rateLeftOut } from './rate-left-out';
import { ringCeiling } from '../misread/ring-ceiling';
import type { TestResult, Verdict } from '../types';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import { sayKept } from '../words/say-kept';
import { sayRate } from '../words/say-rate';
import { sayTest } from '../words/say-test';

/** Reasons for the answer, the weightiest first, each a sentence with its number. */
export function because(
  verdict: Verdict,
  evidence: Evidence,
  excess: number | null,
  needed: number | null
): string[] {
  const { options, moments, tests, certificate, trials } = evidence;
  const misread = evidence.misread?.applies ? evidence.misread : null;
  const out: string[] = [];
  if (verdict === 'undecided' && rateLeftOut(evidence))
    out.push('All that follows takes the counts as they were read, without misreads.');
  if (certificate && certificate.p <= options.alpha) {
    out.push(
      `Exact certificate, without fit or simulation: ${formatPercent(certificate.shots / evidence.shots)} of the shots (${formatCount(certificate.shots)}) have a count of ${formatCount(certificate.count)} or ${certificate.side === 'high' ? 'more' : 'less'}, and no independent trials with a mean within its limits${misread ? `, however misread at the ${evidence.rates ? 'rates within the interval' : 'rate stated'},` : ''} give more than ${formatPercent(certificate.bound)} (p at most ${formatNumber(certificate.p, 2)}).`
    );
  }
  for (const alike of alikeTests(tests.filter((test) => test.pAdjusted <= options.alpha))) {
    const [test] = alike;
    const value = alike.length === 1 ? 'as extreme a value' : 'values as extreme as these, each by itself,';
    out.push(
      `${alike.map((one) => names[one.id]).join(', ')}: ${value} ${sayTest(test)}; adjusted for ${tests.length} tests p ${test.p <= test.smallestP ? '≤' : '='} ${formatNumber(test.pAdjusted, 2)}.`
    );
  }
  const { dispersion } = moments;
  if (dispersion.value !== null) {
    out.push(
      `The variance is ${sayInterval(dispersion, 3)} times the ceiling of independent trials with this mean${options.kept ? `, of which only ${sayKept(options.kept)} were kept` : ''}${misread ? `, read with ${sayRate(misread.rate)} of the sites misread` : ''}.`
    );
    const mean = moments.mean.value!;
    const raw = misread && trials ? moments.variance.value! / ceilingUnread(options, mean, trials) : NaN;
    if (Number.isFinite(raw)) {
      out.push(`Without misreads it would be ${formatNumber(raw, 3)} times the ceiling.`);
    }
  }
  if (evidence.rates) out.push(evidence.rates.statement);
  if (evidence.drift?.split) out.push(evidence.drift.statement);
  if (verdict !== 'ruled-out' && excess !== null) {
    out.push(
      `With this many shots an excess of ${formatPercent(excess)} over the ceiling is seen in four of five repeats, by the variance alone at a level of 5\u202f%.`
    );
  }
  if (verdict === 'undecided' && needed !== null) {
    out.push(
      `If the variance stays where it is now, about ${formatCount(needed)} shots in all would decide.`
    );
  }
  if (verdict === 'compatible') {
    out.push('Compatible is not the same as independent: some interacting systems give exactly such counts.');
  }
  return out;
}

/** Ceiling at that mean if no site were misread. */
function ceilingUnread({ geometry }: Evidence['options'], mean: number, trials: number): number {
  return geometry === 'ring-bonds' ? ringCeiling(trials, 0)(mean).variance : mean * (1 - mean / trials);
}

/** Tests that say the same are told in one sentence. */
function alikeTests(tests: TestResult[]): TestResult[][] {
  const groups = new Map<string, TestResult[]>();
  for (const test of tests) {
    const key = `${test.p} ${test.pAdjusted} ${test.resamples}`;
    groups.set(key, [...(groups.get(key) ?? []), test]);
  }
  return [...groups.values()];
}

const names = {
  ceiling: 'Variance ceiling',
  fit: 'Fit of the best independent law',
  'high-tail': 'High tail',
  'low-tail': 'Low tail',
  parity: 'Parity',
  'empty-shots': 'Empty shots',
  batches: 'Batches',
  order: 'Order of shots'
} as const;
