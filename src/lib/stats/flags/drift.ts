import type { Flag } from '../types';
import { sayTest } from '../words/say-test';
import { gradeOf, stronger, type Evidence } from './evidence';

/** Drift: counts differ between batches, or depend on the order in which shots were taken. */
export function drift(evidence: Evidence): Flag | null {
  const grade = stronger(gradeOf(evidence, 'batches'), gradeOf(evidence, 'order'));
  if (!grade) return null;
  const tests = (['batches', 'order'] as const).filter((id) => gradeOf(evidence, id));
  const first = evidence.tests.find((test) => test.id === tests[0])!;
  const alternating = tests[0] === 'order' && evidence.neighbours === 'alternating';
  return {
    id: 'drift',
    grade,
    tests,
    statement:
      tests[0] === 'batches'
        ? 'The rate differed between batches, so the shots are not alike.'
        : alternating
          ? 'Neighbouring shots differ more than chance would have it: one shot leans against the one before.'
          : 'Neighbouring shots resemble each other: the rate changed while the shots were taken.',
    size: `${tests[0] === 'batches' ? 'Batches this uneven' : 'An order this far from chance'} ${sayTest(first)} if every shot were alike.`,
    otherCauses: [
      'temperature',
      'laser or drive power',
      'recalibration between batches',
      'memory from one shot to the next'
    ],
    next: [
      'Check each batch alone: what is left of the excess there is not drift.',
      'Interleave settings shot by shot, so that drift falls on all of them alike.'
    ]
  };
}
