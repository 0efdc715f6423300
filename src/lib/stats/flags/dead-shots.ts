import type { Flag } from '../types';
import { formatCount, formatNumber } from '../words/format-number';
import { allEven, gradeOf, type Evidence } from './evidence';

/** Dead shots: more empty shots than the law of the others expects. When all counts are even, pairing says it. */
export function deadShots(evidence: Evidence): Flag | null {
  let grade = gradeOf(evidence, 'empty-shots');
  if (!grade || allEven(evidence)) return null;
  // Where the low tail is heavy even with empty shots set aside, they are only its end.
  if (evidence.lowTailOfTheRest !== null && evidence.lowTailOfTheRest <= 0.05) grade = 'hinted';
  const { seen, expected } = evidence.empty;
  return {
    id: 'dead-shots',
    grade,
    tests: ['empty-shots'],
    statement: 'Too many shots are empty for the shots that are not.',
    size: `${formatCount(seen)} empty shots, where the law of the others expects ${formatNumber(expected, 3)}.`,
    otherCauses: [
      'failed preparation, a shutter or a trigger that missed',
      'lost atoms or a reset that left the device in its ground state',
      'bunching, drift of the rate, or loss of defects in pairs, each of which widens the counts down to 0'
    ],
    next: [
      'Log a flag for each shot that says whether preparation worked, and drop by that flag, never by the count.',
      'See whether empty shots cluster in time.'
    ]
  };
}
