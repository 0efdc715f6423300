import type { LinkOptions } from '$lib/model/link/link-options';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { makeLink } from '$lib/server/services/links/make-link';
import { saveReport } from '$lib/server/services/reports/save-report';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData, DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { makeMember, makeTeam } from './people';
import { makeDataset } from './saved-reports';

/** Invented: nine different counts, so that a link can keep them back, each number of shots told from the others. */
export const nineCounts: CountData = {
  kind: 'histogram',
  counts: [
    [0, 137],
    [1, 409],
    [2, 611],
    [3, 523],
    [4, 347],
    [5, 163],
    [6, 59],
    [7, 19],
    [8, 5]
  ],
  lump: null
};

export const plainLink: LinkOptions = {
  label: 'referee 2',
  audience: 'anyone',
  people: [],
  shows: 'report-and-counts',
  blind: false,
  hidesReferees: false,
  allowsRemarks: false,
  expiresAt: null,
  visitLimit: null
};

/** Names that a blind link must hide, each unlike any word of the program. */
export const SECRETS = {
  team: 'Quaggalab',
  slug: 'quaggalab',
  device: 'Okapitron',
  firmware: 'fw-zebu-7',
  group: 'Numbatzone',
  dataset: 'Wombat run',
  notes: 'asked by Ibexia',
  trialsWhy: 'all sites of Okapitron',
  postSelection: 'cuts of Numbatov',
  quenchUnit: 'gnus'
};

let known: Promise<{ document: Diagnosis; options: DiagnoseOptions }> | null = null;

/** The nine counts, diagnosed once. */
export function diagnoseNine(): Promise<{ document: Diagnosis; options: DiagnoseOptions }> {
  const options = { ...defaultOptions, trials: 24, resamples: 99 };
  known ??= diagnose(nineCounts, options).then((document) => ({ document, options }));
  return known;
}

/** A team with a lead and a report of the nine counts, under names to hide. */
export async function shared(
  db: Database
): Promise<{ lead: Actor; reportId: string; teamId: string; datasetId: string }> {
  const team = makeTeam(db, SECRETS.slug);
  db.$client.prepare('update team set name = ? where id = ?').run(SECRETS.team, team.id);
  const lead = makeMember(db, team.id, 'lead');
  const { device, firmware, group, notes, trialsWhy, postSelection, quenchUnit } = SECRETS;
  const datasetId = makeDataset(db, team.id, lead.personId, {
    ...{ device, firmware, group, notes, trialsWhy, postSelection, quenchUnit, name: SECRETS.dataset },
    quenchTime: 4,
    holdTime: 2.5,
    holdUnit: 'µs',
    trials: 24,
    counts: JSON.stringify(nineCounts),
    measuredOn: '2031-02-03'
  });
  const made = await diagnoseNine();
  const { id } = db.transaction((tx) =>
    saveReport(tx, { teamId: team.id, datasetId, createdBy: lead.personId, ...made }, 1000)
  );
  return { lead, reportId: id, teamId: team.id, datasetId };
}

/** A link that must be made. */
export function linked(
  db: Database,
  lead: Actor,
  reportId: string,
  more: Partial<LinkOptions> = {},
  now = 2000
): { id: string; token: string } {
  const made = makeLink(db, lead, { report: reportId }, { ...plainLink, ...more }, now);
  if (!made.ok) throw new Error(made.reason);
  return made;
}
