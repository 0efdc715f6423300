import { TESTS } from '$lib/model/labels';
import type { Diagnosis, TestId } from '$lib/stats/types';
import { compareLines, type NamedValue } from './compare-lines';
import type { ComparedPart } from './compared';

/** p-values, raised for all tests and bare, of every test that ran in one result or in both. */
export function compareTests(first: Diagnosis, second: Diagnosis): ComparedPart {
  const ids = (Object.keys(TESTS) as TestId[]).filter((id) =>
    [first, second].some(({ tests }) => tests.some((test) => test.id === id))
  );
  const value = (document: Diagnosis, id: TestId, key: 'p' | 'pAdjusted'): number | string =>
    document.tests.find((test) => test.id === id)?.[key] ?? 'not run';
  const lines = ids.flatMap((id): NamedValue[] => [
    [`${TESTS[id]}: p, all tests`, value(first, id, 'pAdjusted'), value(second, id, 'pAdjusted')],
    [`${TESTS[id]}: p`, value(first, id, 'p'), value(second, id, 'p')]
  ]);
  return compareLines('tests', 'Tests', lines);
}
