import type { Flag } from '../types';
import { sayTest } from '../words/say-test';
import { allEven, gradeOf, type Evidence } from './evidence';

/** Bursts: the high tail alone is heavier than the best law allows, the low tail was asked and is not. */
export function bursts(evidence: Evidence): Flag | null {
  const grade = gradeOf(evidence, 'high-tail');
  const low = evidence.tests.find((test) => test.id === 'low-tail');
  if (!grade || !low || gradeOf(evidence, 'low-tail') || allEven(evidence)) return null;
  const test = evidence.tests.find((one) => one.id === 'high-tail')!;
  return {
    id: 'bursts',
    grade,
    tests: ['high-tail', ...(gradeOf(evidence, 'ceiling') ? (['ceiling'] as const) : [])],
    statement:
      'Some shots hold far more defects than the rest allows, while shots with few are as frequent as they should be.',
    size: `A high tail this heavy ${sayTest(test)} if defects formed independently.`,
    otherCauses: [
      'rare outside events, such as cosmic rays or voltage spikes',
      'spurious resets or failed preparation that leave many defects at once',
      'a short run at another setting, pooled with the rest'
    ],
    next: [
      'Look at the time stamps of the shots with the largest counts: bursts cluster, chance does not.',
      'Repeat with a veto on the suspected events and compare.'
    ]
  };
}
