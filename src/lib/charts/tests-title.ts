import type { Diagnosis } from '$lib/stats/types';

/** The finding of the tests together, as a title. */
export function testsTitle({ tests, engine }: Diagnosis): string {
  const shown = tests.filter((test) => test.pAdjusted <= engine.alpha).length;
  if (!shown) return `None of ${tests.length} tests speaks against independent trials`;
  return `${shown} of ${tests.length} tests ${shown === 1 ? 'speaks' : 'speak'} against independent trials`;
}
