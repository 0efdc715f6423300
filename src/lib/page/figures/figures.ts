import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { ceilingTitle } from '$lib/charts/ceiling-title';
import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTitle } from '$lib/charts/cumulants-title';
import { distributionPicture } from '$lib/charts/distribution-picture';
import { distributionTable } from '$lib/charts/distribution-table';
import { distributionTitle } from '$lib/charts/distribution-title';
import { driftPicture } from '$lib/charts/drift-picture';
import { driftTable } from '$lib/charts/drift-table';
import { driftTitle } from '$lib/charts/drift-title';
import { explanationsPicture } from '$lib/charts/explanations-picture';
import { explanationsTable } from '$lib/charts/explanations-table';
import { explanationsTitle } from '$lib/charts/explanations-title';
import type { Picture, Size } from '$lib/charts/picture';
import { ratePicture } from '$lib/charts/rate-picture';
import { rateTable } from '$lib/charts/rate-table';
import { rateTitle } from '$lib/charts/rate-title';
import { regionPicture } from '$lib/charts/region-picture';
import { regionTable } from '$lib/charts/region-table';
import type { Table } from '$lib/charts/table';
import { tailsPicture } from '$lib/charts/tails-picture';
import { tailsTable } from '$lib/charts/tails-table';
import { tailsTitle } from '$lib/charts/tails-title';
import { testsPicture } from '$lib/charts/tests-picture';
import { testsTable } from '$lib/charts/tests-table';
import { testsTitle } from '$lib/charts/tests-title';
import { trialsPicture } from '$lib/charts/trials-picture';
import { trialsTable } from '$lib/charts/trials-table';
import { trialsTitle } from '$lib/charts/trials-title';
import { TESTS } from '$lib/model/labels';
import type { Diagnosis } from '$lib/stats/types';
import type { FigureKind } from './figure-kind';

interface Figure {
  /** The id of its heading begins with it, and the names of its files end with it. */
  id: string;
  title: string;
  draw: (size: Size) => Picture;
  table: Table;
}

/** A kind of figure that reads the whole document. */
const kind =
  (
    id: string,
    title: (of: Diagnosis) => string,
    picture: (of: Diagnosis, size: Size) => Picture,
    table: (of: Diagnosis) => Table
  ) =>
  (of: Diagnosis): Figure => ({
    ...{ id, title: title(of), draw: (size) => picture(of, size), table: table(of) }
  });

/** The figures of a report by kind; undefined where the document has nothing to draw. */
export const FIGURES: Record<FigureKind, (of: Diagnosis) => Figure | undefined> = {
  distribution: kind('distribution', distributionTitle, distributionPicture, distributionTable),
  rate: kind('rate-function', rateTitle, ratePicture, rateTable),
  tails: kind('tails-and-bounds', tailsTitle, tailsPicture, tailsTable),
  ceiling: kind('ceiling', ceilingTitle, ceilingPicture, ceilingTable),
  region: (of) => {
    const place = cumulantsPlace(of);
    if ('reason' in place) return undefined;
    const draw = (size: Size): Picture => regionPicture(place, size);
    return { id: 'cumulants-region', title: cumulantsTitle(place), draw, table: regionTable(place) };
  },
  tests: kind(
    'tests-chart',
    testsTitle,
    (of, size) => testsPicture(of, size, TESTS),
    (of) => testsTable(of, TESTS)
  ),
  explanations: ({ explanations: of, engine: { alpha } }) =>
    of && {
      id: 'explanations-chart',
      title: explanationsTitle(of, alpha),
      draw: (size) => explanationsPicture(of, size, alpha),
      table: explanationsTable(of, alpha)
    },
  drift: ({ nuisances }) => {
    const of = nuisances?.drift;
    return (
      of && {
        id: 'drift',
        title: driftTitle(of),
        draw: (size) => driftPicture(of, size),
        table: driftTable(of)
      }
    );
  },
  trials: ({ nuisances }) => {
    const of = nuisances?.trials;
    return (
      of && {
        id: 'as-n-runs',
        title: trialsTitle(of),
        draw: (size) => trialsPicture(of, size),
        table: trialsTable(of)
      }
    );
  }
};
