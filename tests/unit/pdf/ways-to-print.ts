import { EXPLANATIONS, REFERENCES, TESTS } from '$lib/model/labels';

/**
 * How a number may be printed, written here anew so that it does not lean on what prints it: in full, or rounded to
 * some digits, plainly, as a share in per cent, or with a power of ten; thousands with a blank between.
 */
export function ways(value: number, least: number): string[] {
  const grouped = (text: string) => {
    const [whole, part] = text.replace('-', '−').split('.');
    const spaced = whole.replace(/\B(?=(\d{3})+$)/g, ' ?');
    return part === undefined ? spaced : `${spaced}\\.${part}`;
  };
  const all = new Set([grouped(String(value))]);
  for (const digits of [2, 3, 4, 5, 6, 7].filter((some) => some >= least))
    for (const scaled of [value, 100 * value]) {
      const [mantissa, power] = scaled.toExponential(digits - 1).split('e');
      const places = Math.max(0, digits - 1 - Number(power));
      if (places < 12) all.add(grouped(scaled.toFixed(places)));
      const raised = power.replace(/[+-]/, '').replace(/\d/g, (digit) => '⁰¹²³⁴⁵⁶⁷⁸⁹'[Number(digit)]);
      all.add(`${grouped(mantissa)} × 10${Number(power) < 0 ? '⁻' : ''}${raised}`);
    }
  return [...all];
}

/** What stands before a number of one or two digits, which by itself would be found anywhere. */
const BEFORE: Record<string, string> = {
  'engine, seed': 'Seed',
  'engine, resamples': 'at most',
  'data, trials': 'Trials in a shot, N',
  'data, batches': 'known,',
  'rate, scale': 'Trials in a shot, N',
  'fit, floor': 'floor, nats',
  'fit, divergenceCorrected': 'divergence, chance taken off, nats',
  'fit, shotsToNotice': 'shots that make it noticeable',
  'explanations, tieWithin': 'less than',
  'certificate, p': 'exact certificate',
  'certificate, thresholds': 'With all',
  'certificate, shots': 'The most telling tail:',
  'batches, tested': 'Of the'
};

/** Numbers of which page and PDF tell two or three digits, in a sentence, and the words before them there. */
export const TOLD: Record<string, string> = {
  'answer, smallestExcess': 'show an excess of',
  'moments, criticalTrials': 'N is at least',
  'pairs, covariance': 'covariance at least',
  'pairs, correlation': 'are correlated by at least',
  'batches, dispersion': 'Tested batch by batch and pooled,',
  'batches, excessWithin': 'Variance above the ceiling:',
  'batches, excessBetween': 'Variance above the ceiling:',
  'batches, meansVariance': 'The true means of the batches have a variance of',
  'batches, p': 'All batches pooled:',
  'batches, pTogether': 'All batches pooled:',
  'batches, correlation of neighbouring shots': 'Neighbouring shots of a batch are correlated by',
  'batches, p of that correlation': 'Neighbouring shots of a batch are correlated by',
  'batches, dispersion from shot to shot': 'From one shot to the next the variance is',
  'misreads, neededRate': 'To compare with your calibration:',
  'misreads, largestRate': 'At most'
};

/** Numbers that say by a 0 that there is nothing: no Poisson part, no resamples behind a p. */
export const NONE = ['fit, poissonPart', 'batches, smallestP'];

export function wordsBefore(part: string, item: string): string {
  const [, kind, id] = /^(test|law|explanation) (.+)$/.exec(part) ?? [];
  if (kind === 'test') return TESTS[id as keyof typeof TESTS];
  if (kind === 'law') return REFERENCES[id as keyof typeof REFERENCES];
  if (kind === 'explanation') return EXPLANATIONS[id as keyof typeof EXPLANATIONS];
  // "shots 2476 to 2550, with …", of which the second is said right before the mean.
  if (part === 'mean over time') return /to (\d+)/.exec(item)![1].replace(/\B(?=(\d{3})+$)/g, ' ');
  return BEFORE[`${part}, ${item}`] ?? '';
}
