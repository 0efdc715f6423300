import { allEven, oddOnRing, pairsOnRing, type Evidence } from '../flags/evidence';
import { sayStretches } from '../rate-interval/say-rates';
import type { Flag, Verdict } from '../types';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { sayRate } from '../words/say-rate';
import { sayHowOften } from '../words/say-p';
import { rateLeftOut } from './rate-left-out';
import { restsOnSearch } from './rests-on-search';
import { resamplesNeeded, unreachable } from './unreachable';

/** The answer in one or two sentences, plain first. */
export function statement(
  verdict: Verdict,
  evidence: Evidence,
  flags: Flag[],
  needed: number | null
): string {
  const shots = `${formatCount(evidence.shots)} ${evidence.shots === 1 ? 'shot' : 'shots'}`;
  if (verdict === 'ruled-out') {
    return `Independent trials cannot explain these ${shots}: ${strongest(evidence)}${ordinaryCause(evidence, flags)}`;
  }
  if (verdict === 'compatible') {
    const regular = flags.some((flag) => flag.id === 'regular');
    return (
      `These ${shots} are compatible with independent trials: with 95\u202f% confidence their variance is below ${formatNumber(1 + evidence.options.tolerance, 3)} times the ceiling${evidence.misread?.applies ? `, with ${sayRate(evidence.misread.rate)} of the sites misread${evidence.rates ? ', and at every rate within its uncertainty' : ''}` : ''}.` +
      (regular
        ? evidence.trials === null
          ? ' They vary less than rare events of this mean would: a limited number of sites gives that by itself, and repulsion between defects would too.'
          : pairsOnRing(evidence)
            ? ' They are more regular than equal pairs, as single independent kinks on a ring are, and kinks that repel each other.'
            : ' They are more regular than equal trials, which repulsion between defects would also give.'
        : '') +
      (oddOnRing(evidence) > 0
        ? ` But no ring gives an odd count, and ${formatCount(oddOnRing(evidence))} of these are odd: they were read or written wrongly, and the answer takes them as they stand.`
        : '')
    );
  }
  if (evidence.moments.variance.value === null)
    return 'One shot cannot tell: it has no spread to compare with anything.';
  if (evidence.moments.mean.value === 0)
    return `No defect was seen in ${shots}, so there is nothing to test.`;
  if (evidence.moments.variance.value === 0)
    return `Every one of these ${shots} had the same count, so there is no spread to test.`;
  if (rateLeftOut(evidence)) return leftOut(shots, evidence);
  if (restsOnSearch(evidence))
    return `These ${shots} cannot tell: they misfit the best law found, but their variance lies below the ceiling, where bonds that are sure or excluded in an order that was not searched can give such counts without any interaction.`;
  const blind = unreachable(evidence);
  if (blind.length > 0) {
    return `These ${shots} cannot be judged with ${formatCount(evidence.options.resamples)} resamples: ${blind.length === 1 ? 'one test is' : `${formatCount(blind.length)} tests are`} as extreme as so few can show. Use at least ${formatCount(resamplesNeeded(evidence))}.`;
  }
  if (evidence.rates && evidence.rates.changes.length > 0)
    return `These ${shots} cannot tell, because the misread rate is not known well enough. ${sayStretches(evidence.rates)} With its uncertainty it may be ${formatPercent(evidence.rates.low, 3)} to ${formatPercent(evidence.rates.high, 3)}: measure it better.`;
  if (evidence.rates?.rates.every((one) => one.verdict === 'ruled-out'))
    return `These ${shots} cannot tell: at each misread rate tried, from ${formatPercent(evidence.rates.low, 3)} to ${formatPercent(evidence.rates.high, 3)}, some test rules independent trials out, but no test does so at all of them. Measure the misread rate better.`;
  const more = needed ? ` About ${formatCount(needed)} shots in all would decide.` : '';
  const hints = flags.filter((flag) => flag.grade === 'hinted' && flag.id !== 'regular');
  const hint =
    hints.length > 0
      ? ` There is a hint of ${hints.map((flag) => flag.id.replace('-', ' ')).join(' and ')}.`
      : '';
  return `These ${shots} cannot tell: they neither rule out independent trials nor exclude an excess that matters.${hint}${more}`;
}

/** The answer where the tests ran without the misreads that there are. */
function leftOut(shots: string, { misread, options, tests, certificate }: Evidence): string {
  if (misread?.applies === false && misread.largest !== undefined)
    return `These ${shots} cannot be judged with the misread rate that was stated. It cannot be right: these counts allow ${formatPercent(misread.largest, 3)} at most. Correct it, or leave it out to test the counts as they were read.`;
  const extreme = [...tests.map(({ pAdjusted }) => pAdjusted), certificate?.p ?? 1].some(
    (p) => p <= options.alpha
  );
  const why = 'the misread rate that was stated could not be allowed for; the cautions say why';
  return extreme
    ? `These ${shots} cannot be judged: without misreads no independent trials explain them, and ${why}.`
    : `These ${shots} cannot tell: without misreads they neither rule out independent trials nor exclude an excess that matters, and ${why}.`;
}

/** The ordinary cause that must be settled first, where the counts themselves point at one. */
function ordinaryCause(evidence: Evidence, flags: Flag[]): string {
  const raised = (id: Flag['id']) => flags.some((flag) => flag.id === id);
  if (allEven(evidence))
    return ' But every count is even: on a ring that is so by construction, and pairs should be counted.';
  const drift = flags.find(({ id }) => id === 'drift');
  // Shots that lean against the one before do not drift; batches that differ do, however neighbours stand.
  if (drift && (drift.tests.includes('batches') || evidence.neighbours !== 'alternating'))
    return driftAlone(evidence);
  const { misread } = evidence;
  // Of sites: a misread there leaves the trials independent (see rateLeftOut).
  if (misread && !misread.applies && misread.largest !== undefined)
    return ` But the misread rate that was stated cannot be right: these counts allow ${formatPercent(misread.largest, 3)} at most.`;
  if (raised('misreads')) return ' But misread sites alone could give this.';
  return '';
}

/** Whether the excess is still there within batches, where there are any. */
function driftAlone({ drift, moments, tests, options }: Evidence): string {
  const shown = tests.some(({ id, p }) => id === 'ceiling' && p <= options.alpha);
  if (drift?.split?.verdict === 'compatible' && !shown)
    return ' But the rate changed while the shots were taken: within batches the counts are compatible with independent trials.';
  if (drift?.split?.verdict === 'compatible')
    return ' But the rate changed while the shots were taken: within batches the counts are compatible with independent trials, and the excess lies between batches.';
  if (drift?.split?.verdict === 'excess')
    return ' The rate also changed while the shots were taken, but the excess survives when batches are tested one by one and pooled.';
  if (!((moments.dispersion.value ?? 0) > 1))
    return ' But the rate changed while the shots were taken, so the shots are not all alike, though their variance keeps the ceiling.';
  return ' But the rate changed while the shots were taken, which alone makes counts look bunched.';
}

/** The strongest single piece of evidence, in words. */
function strongest({ tests, certificate, options }: Evidence): string {
  if (certificate && certificate.p <= options.alpha) {
    return `a tail of the counts this heavy ${sayHowOften(certificate.p, certificateFloor)} under any independent trials with this mean, whatever their probabilities.`;
  }
  const best = [...tests].sort((a, b) => a.pAdjusted - b.pAdjusted || a.p - b.p)[0];
  // The adjusted p, which the verdict rests on: one of several tests would look extreme more often than each does.
  const allowed = tests.length > 1 ? `, all ${formatCount(tests.length)} tests allowed for` : '';
  return `${finding[best.id]} ${sayHowOften(best.pAdjusted, best.p <= best.smallestP ? best.pAdjusted : 0)} if ${best.id === 'batches' || best.id === 'order' ? 'all shots were alike' : 'defects formed independently'}${allowed}.`;
}

/** A certificate's p is an upper bound that never goes below its own β = 1e-6, nor much above it in clear cases. */
const certificateFloor = 1.01e-6;

const finding = {
  ceiling: 'counts this uneven',
  fit: 'a mismatch this large with the best independent law',
  'high-tail': 'this many shots with large counts',
  'low-tail': 'this many shots with small counts',
  parity: 'a preference this strong for one parity',
  'empty-shots': 'this many empty shots',
  batches: 'batches this different',
  order: 'an order this far from chance'
} as const;
