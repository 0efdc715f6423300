import { TESTS } from '$lib/model/labels';
import { sourceLine } from '$lib/model/report/source-line';
import type { Diagnosis } from '$lib/stats/types';
import { ceilingPicture } from './ceiling-picture';
import { ceilingTitle } from './ceiling-title';
import { cumulantsPlace } from './cumulants-place';
import { cumulantsTitle } from './cumulants-title';
import { distributionPicture } from './distribution-picture';
import { distributionTitle } from './distribution-title';
import { explanationsPicture } from './explanations-picture';
import { explanationsTitle } from './explanations-title';
import type { Picture, Size } from './picture';
import { ratePicture } from './rate-picture';
import { rateTitle } from './rate-title';
import { regionPicture } from './region-picture';
import { sheetOf } from './sheet-of';
import { sheetToSvg } from './sheet-to-svg';
import { tailsPicture } from './tails-picture';
import { tailsTitle } from './tails-title';
import { testsPicture } from './tests-picture';
import { testsTitle } from './tests-title';

type Made = [name: string, title: string, draw: (size: Size) => Picture];

/**
 * Every chart of a document as an SVG file, by its name: the same that the page saves, one chart at a time. Needs no
 * page: it draws on a server too.
 *
 * @param name of the dataset, for the line below each chart; null leaves it out
 */
export function chartFiles(diagnosis: Diagnosis, name: string | null): Record<string, string> {
  const made: Made[] = [
    ['distribution', distributionTitle(diagnosis), (size) => distributionPicture(diagnosis, size)],
    ['rate-function', rateTitle(diagnosis), (size) => ratePicture(diagnosis, size)],
    ['tails-and-bounds', tailsTitle(diagnosis), (size) => tailsPicture(diagnosis, size)],
    ['ceiling', ceilingTitle(diagnosis), (size) => ceilingPicture(diagnosis, size)]
  ];
  const place = cumulantsPlace(diagnosis);
  if (!('reason' in place))
    made.push(['cumulants-region', cumulantsTitle(place), (size) => regionPicture(place, size)]);
  if (diagnosis.tests.length > 0)
    made.push(['tests', testsTitle(diagnosis), (size) => testsPicture(diagnosis, size, TESTS)]);
  const { explanations } = diagnosis;
  if (explanations)
    made.push([
      'explanations',
      explanationsTitle(explanations, diagnosis.engine.alpha),
      (size) => explanationsPicture(explanations, size, diagnosis.engine.alpha)
    ]);
  const source = sourceLine(diagnosis, name);
  return Object.fromEntries(
    made.map(([file, title, draw]) => [
      file,
      sheetToSvg(sheetOf(draw({ width: 720, text: 13 }), title, source), title)
    ])
  );
}
