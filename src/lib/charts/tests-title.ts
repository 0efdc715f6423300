import type { Diagnosis } from '$lib/stats/types';

/** The finding of the tests together, as a title. */
export function testsTitle({ tests, tails, engine }: Diagnosis): string {
  const shown = tests.filter((test) => test.pAdjusted <= engine.alpha).length;
  const certified = tails.certificate !== null && tails.certificate.p <= engine.alpha;
  if (shown)
    return `${shown} of ${tests.length} tests ${shown === 1 ? 'speaks' : 'speak'} against independent trials`;
  if (certified) return 'The exact certificate speaks against independent trials';
  return `None of ${tests.length} tests reaches the level at which independent trials are ruled out`;
}
