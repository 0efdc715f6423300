import { FLAGS } from '$lib/model/labels';
import type { Diagnosis } from '$lib/stats/types';

/** The finding of the tests together, as a title. */
export function testsTitle(diagnosis: Diagnosis): string {
  return sayTests(diagnosis) + sayFlags(diagnosis);
}

/** What the flags that are shown say, as the end of the sentence; a remark is no finding of the tests. */
function sayFlags({ flags }: Diagnosis): string {
  const names = flags
    .filter(({ id, grade }) => grade === 'shown' && id !== 'regular')
    .map(({ id }) => FLAGS[id].toLowerCase());
  if (!names.length) return '';
  const last = names[names.length - 1];
  return `, and the counts point to ${names.length > 1 ? `${names.slice(0, -1).join(', ')} and ` : ''}${last}`;
}

function sayTests({ tests, tails, engine }: Diagnosis): string {
  const shown = tests.filter((test) => test.pAdjusted <= engine.alpha).length;
  const certified = tails.certificate !== null && tails.certificate.p <= engine.alpha;
  if (shown)
    return `${shown} of ${tests.length} tests ${shown === 1 ? 'speaks' : 'speak'} against independent trials`;
  if (certified) return 'The exact certificate speaks against independent trials';
  return `None of ${tests.length} tests reaches the level at which independent trials are ruled out`;
}
