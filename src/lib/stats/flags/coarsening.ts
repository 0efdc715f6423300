import type { Flag } from '../types';
import { sayTest } from '../words/say-test';
import { allEven, gradeOf, type Evidence } from './evidence';

/** Coarsening: the low tail alone is heavy, and still is with empty shots set aside. */
export function coarsening(evidence: Evidence): Flag | null {
  const grade = gradeOf(evidence, 'low-tail');
  if (!grade || gradeOf(evidence, 'high-tail') || allEven(evidence)) return null;
  const { lowTailOfTheRest } = evidence;
  if (evidence.empty.seen > 0 && (lowTailOfTheRest === null || lowTailOfTheRest > 0.05)) return null;
  const test = evidence.tests.find((one) => one.id === 'low-tail')!;
  return {
    id: 'coarsening',
    grade,
    tests: ['low-tail'],
    statement:
      'Shots with few defects are too frequent, and not through empty shots alone: defects seem to be lost together.',
    size: `A low tail this heavy ${sayTest(test)} if defects formed and stayed independently.`,
    otherCauses: [
      'dead shots in which part of the device did not take part',
      'post-selection that favours clean shots',
      'a slow drift of the rate'
    ],
    next: [
      'Measure at several hold times: pairwise loss lowers the counts and changes their factorial cumulants, independent loss does not.',
      'Give the shots in order, so that drift can be told from loss.'
    ]
  };
}
