import type { LinkOptions } from '$lib/model/link/link-options';
import { team } from '$lib/server/db/schema';
import { makeLink } from '$lib/server/services/links/make-link';
import { saveReport } from '$lib/server/services/reports/save-report';
import type { Actor } from '$lib/server/services/access/actor';
import type { Diagnosis } from '$lib/stats/types';
import { eq } from 'drizzle-orm';
import { diagnoseNine, nineCounts, plainLink, SECRETS } from '../../support/links';
import { makeDataset } from '../../support/saved-reports';
import { seedPerson, seedTeam, withDatabaseOf, type SeededPerson } from './seed-people';
import type { RunningServer } from './start-server';

export interface SharedReport {
  lead: SeededPerson;
  actor: Actor;
  team: { id: string; slug: string; name: string };
  reportId: string;
  datasetId: string;
}

/** A report of the nine counts in a running server, made by a lead of a team under names to hide. */
export async function seedSharedReport(
  server: Pick<RunningServer, 'data'>,
  alter: (document: Diagnosis) => void = () => {}
): Promise<SharedReport> {
  const lead = await seedPerson(server, { name: 'Ibexia Invented' });
  const slug = `${SECRETS.slug}-${lead.id.slice(0, 6)}`;
  const made = await seedTeam(server, slug, [[lead, 'lead']]);
  const { document, options } = await diagnoseNine();
  const kept = structuredClone(document);
  alter(kept);
  return withDatabaseOf(server, (db) => {
    db.update(team).set({ name: SECRETS.team }).where(eq(team.id, made.id)).run();
    const { device, firmware, group, notes, trialsWhy, postSelection, quenchUnit } = SECRETS;
    const datasetId = makeDataset(db, made.id, lead.id, {
      ...{ device, firmware, group, notes, trialsWhy, postSelection, quenchUnit, name: SECRETS.dataset },
      quenchTime: 4,
      trials: 24,
      counts: JSON.stringify(nineCounts)
    });
    const { id } = db.transaction((tx) =>
      saveReport(tx, { teamId: made.id, datasetId, createdBy: lead.id, document: kept, options })
    );
    return {
      lead,
      actor: { personId: lead.id, teamId: made.id, role: 'lead' as const },
      team: { ...made, name: SECRETS.team },
      reportId: id,
      datasetId
    };
  });
}

/** A link to it, as its maker would make one; `now` may lie in the past. */
export function seedLink(
  server: Pick<RunningServer, 'data'>,
  { actor, reportId }: SharedReport,
  more: Partial<LinkOptions> = {},
  now = Date.now()
): Promise<{ id: string; path: string; token: string }> {
  return withDatabaseOf(server, (db) => {
    const made = makeLink(db, actor, { report: reportId }, { ...plainLink, ...more }, now);
    if (!made.ok) throw new Error(made.reason);
    return { id: made.id, path: `/link/${made.token}`, token: made.token };
  });
}

/** Everything that must not stand in what a blind link gives. */
export function secretsOf(there: SharedReport): string[] {
  const { lead, team: of, reportId, datasetId } = there;
  return [
    of.id,
    of.slug,
    of.name,
    reportId,
    datasetId,
    lead.id,
    lead.email,
    lead.name,
    ...Object.values(SECRETS)
  ];
}
