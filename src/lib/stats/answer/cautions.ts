import { screenCaution } from './screen-caution';
import { oddOnRing, pairsOnRing, ringAsRead, type Evidence } from '../flags/evidence';
import type { Histogram, TestResult } from '../types';
import { formatCount, formatNumber, formatPercent } from '../words/format-number';
import { sayKept } from '../words/say-kept';
import { sayRate } from '../words/say-rate';
import { resamplesNeeded } from './unreachable';

/** What a reader must keep in mind: first what this histogram adds, then what always holds. */
export function cautions(evidence: Evidence, histogram: Histogram, tests: TestResult[]): string[] {
  const { options, shots, trials, moments, misread, rates } = evidence;
  const odd = oddOnRing(evidence);
  const out: string[] = [];
  const { lump, below } = histogram;
  if (lump && !below) {
    out.push(
      `The last row lumps counts of ${formatCount(lump.from)} and more. They enter the likelihood as a tail; mean, variance and what follows from them count each such shot as ${formatCount(lump.from)} and are lower limits. Third and fourth cumulant are not known. The ceiling is then that of equal trials lumped in the same way.`
    );
  }
  if (below) {
    out.push(
      `The first row lumps counts of ${formatCount(below.to)} and fewer${lump ? `, the last those of ${formatCount(lump.from)} and more` : ''}. They enter the likelihood as sums of the law; mean, variance and what follows from them count each such shot as ${formatCount(below.to)}${lump ? ` or ${formatCount(lump.from)}` : ''}, so the variance is a lower limit${lump ? '' : ' and the mean an upper one'}. Third and fourth cumulant are not known. The ceiling is then that of equal trials lumped in the same way. Empty shots and parity cannot be tested.`
    );
  }
  if (options.kept) {
    out.push(
      `Only ${sayKept(options.kept)} were kept, as stated, and every test, the ceiling and every law here is of counts that were cut so. How many shots were dropped is not used. There is no certificate, the bounds of the tails are weaker, and no other stories are told. A cut through the bulk of the counts leaves little to test.`
    );
  }
  if (trials === null) {
    out.push(
      'The number of trials was not given, so the ceiling is the Poisson one. A known number of trials makes every test sharper.'
    );
  }
  if (options.geometry !== 'sites' && !options.misread) {
    out.push(
      'Kinks are read from neighbouring sites: one misread site toggles two bonds, and independent kinks then look bunched. No misread rate was stated, and none is corrected for.'
    );
  }
  if (pairsOnRing(evidence)) {
    out.push(
      'The ceiling is that of independent pairs. Single kinks that form independently round a ring, but for their even total, vary about half as much: between half the ceiling and the ceiling these tests do not see that such kinks bunch.'
    );
  }
  if (odd > 0) {
    out.push(
      `Round a ring kinks come in pairs, so ${odd === 1 ? 'the shot with an odd count was' : `the ${formatCount(odd)} shots with an odd count were`} read or written wrongly, and as many with an even count may have been. They enter every test and bound here as they stand: the answer is of counts so read, not of the ring.`
    );
  }
  if (misread?.applies) {
    const known = rates
      ? `every p and the certificate here are the worst over the interval of that rate (${formatPercent(rates.low, 3)} to ${formatPercent(rates.high, 3)}), plus the chance that it lies outside; its error is taken to be normal, and the rate the same at every site and independent of the others. The law, the bounds of the tails and the split by batches are those at ${sayRate(misread.rate)}.`
      : `every test, bound and flag here allows for exactly that rate, the same at every site and independent of the others. An error of the rate itself is not allowed for: state its uncertainty, or compare the rate needed with the limits of the calibration.`;
    out.push(
      `A misread rate of ${sayRate(options.misread ?? misread.rate)} a site was stated, and ${known} The best law is searched among few orders of the bonds, so independent kinks that are all but sure on some bonds and excluded on others may look like a misfit: where nothing else speaks against independent trials and the variance lies below its ceiling, the answer is that it cannot tell. Ceiling and certificate do not depend on that law.`
    );
    if (ringAsRead(evidence))
      out.push(
        'The law is of single kinks that form independently round the ring but for their even total, and the ceiling theirs: the largest variance that searches in rings of up to 24 bonds found, which is not a proof. Kinks that form in independent pairs vary about twice as much and are an excess here: count pairs to test for these. Certificate and bounds are those of pairs and weaker.'
      );
  } else if (misread?.reason) {
    out.push(misread.reason);
  }
  if (shots < 300 && moments.variance.value) {
    out.push('With fewer than about 300 shots the third and fourth cumulants and the far tails say little.');
  }
  if (tests.some((test) => test.stoppedEarly)) {
    out.push(
      'Resampling of a clear case ended at 100 exceedances (Besag and Clifford 1991); the draws made stand with each test.'
    );
  }
  if (tests.some((test) => test.source === 'resampled' && test.p <= test.smallestP)) {
    const smallest = Math.max(...tests.map((test) => test.smallestP));
    out.push(
      `The smallest p that ${formatCount(options.resamples)} resamples can show is ${formatNumber(smallest, 2)}; the truth may be smaller.`
    );
  }
  const short = tests.filter((test) => test.resamples > 0 && test.smallestP * tests.length > options.alpha);
  if (short.length > 0) {
    const which =
      short.length === tests.length ? 'no test can' : `${short.length} of the ${tests.length} tests cannot`;
    out.push(
      `With the resamples drawn, ${which} reach the level of ${formatNumber(options.alpha, 2)} once adjusted for ${tests.length} tests; that takes at least ${formatCount(resamplesNeeded({ tests, options, rates }))}.`
    );
  }
  return out.concat(always);
}

const always = [
  'Compatible with independent trials does not mean independent: free fermions and some exclusion gases give exactly such counts.',
  'Shots are taken to be alike and independent of each other. Drift between shots breaks that and looks like bunching.',
  screenCaution
];
