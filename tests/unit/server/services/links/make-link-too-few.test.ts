import { link } from '$lib/server/db/schema';
import { makeLink } from '$lib/server/services/links/make-link';
import { saveReport } from '$lib/server/services/reports/save-report';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData } from '$lib/stats/types';
import { expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { plainLink } from '../../../../support/links';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset } from '../../../../support/saved-reports';

/** Invented: forty shots with each of so many counts, and what is left of `shots` with the count 2. */
const even = (different: number, shots: number): CountData => ({
  kind: 'histogram',
  counts: Array.from({ length: different }, (_, i) => [i, i === 2 ? shots - 40 * (different - 1) : 40]),
  lump: null
});

it.each([
  [8, 1000, true],
  [8, 999, false],
  [7, 1000, false],
  [7, 50_000, false]
])('a link without counts, of %i different counts in %i shots: %s', async (different, shots, made) => {
  const db = freshDatabase();
  const teamId = makeTeam(db).id;
  const lead = makeMember(db, teamId, 'lead');
  const datasetId = makeDataset(db, teamId);
  const options = { ...defaultOptions, trials: 24, resamples: 19 };
  const document = await diagnose(even(different, shots), options);
  const { id } = db.transaction((tx) =>
    saveReport(tx, { teamId, datasetId, createdBy: null, document, options })
  );
  const answer = makeLink(db, lead, { report: id }, { ...plainLink, shows: 'report' });
  expect(answer.ok || answer.reason).toBe(made || 'too-few-counts');
  expect(db.select().from(link).all()).toHaveLength(made ? 1 : 0);
  expect(makeLink(db, lead, { report: id }, plainLink).ok).toBe(true);
});
