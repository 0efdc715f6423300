import type { Flag } from '../types';
import { formatNumber } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import { allEven, gradeOf, ringAsRead, type Evidence } from './evidence';

const boundary = 'boundary sites that favour one phase, so that defects enter in pairs';

/**
 * Bunching: the variance ceiling is broken, and not by one tail alone.
 *
 * Not raised when every count is even: counting pairs singly doubles the variance, and pairing says so.
 */
export function bunching(evidence: Evidence): Flag | null {
  const seen = gradeOf(evidence, 'ceiling');
  if (!seen || allEven(evidence)) return null;
  // Batches that differ make the excess, and within them there is none: drift is what is shown.
  const drifted = gradeOf(evidence, 'batches') === 'shown' && evidence.drift?.split?.verdict === 'compatible';
  const grade = drifted ? 'hinted' : seen;
  const high = gradeOf(evidence, 'high-tail');
  const low = gradeOf(evidence, 'low-tail');
  const lowRan = evidence.tests.some((test) => test.id === 'low-tail');
  if (high && lowRan && !low) return null;
  if (low && !high) return null;
  const { dispersion, pairCovariance } = evidence.moments;
  const { trials, misread } = evidence;
  const correlation =
    trials && trials > 1 && pairCovariance !== null
      ? ` Pairs of trials then share a covariance of at least ${formatNumber(pairCovariance / (trials * (trials - 1)), 2)} on average.`
      : '';
  return {
    id: 'bunching',
    grade,
    tests: ['ceiling', ...(high ? (['high-tail'] as const) : []), ...(low ? (['low-tail'] as const) : [])],
    statement: drifted
      ? 'All shots together vary more than any independent trials with this mean can, but within batches they do not: the drift does for it.'
      : 'Defects come together: the counts vary more from shot to shot than any independent trials with this mean can' +
        (misread?.applies ? ', read with the misread rate that was stated.' : '.'),
    size: `The variance is ${sayInterval(dispersion, 3)} times the ceiling of independent trials${misread?.applies ? ' as they are read' : ''}.${correlation}`,
    otherCauses: [
      ...(ringAsRead(evidence)
        ? [
            'kinks that form in independent pairs, which vary about twice as much: count pairs to test for these'
          ]
        : []),
      'a rate that drifted or differed between runs that were pooled',
      misread?.applies
        ? 'more misread sites than stated, or misreads that come together'
        : 'read-out flips, when kinks are read from neighbouring sites: one misread site toggles two bonds',
      ...(evidence.options.geometry === 'ring-bonds' ? [] : [boundary]),
      'dead shots mixed in, which lower the mean and widen the counts'
    ],
    next: [
      evidence.drift
        ? 'Look at the parts within and between batches, and at the change of the mean: the order of the shots is known.'
        : 'Give the shots in order, with their batches: drift would then show by itself.',
      misread?.applies
        ? 'Measure the misread rate of single sites again, with its error.'
        : 'Measure the misread rate of one site, and repeat the check with bonds as geometry.',
      'Check each run alone; bunching by interaction stays, pooling goes.'
    ]
  };
}
