import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, link, linkVisit, person, report, team } from '../../db/schema';

/** The link of a token's hash with its report and how often it was opened; undefined when there is none. */
export function findLink(db: Pick<Database, 'select'>, tokenHash: string) {
  return db
    .select({
      id: link.id,
      teamId: link.teamId,
      reportId: report.id,
      audience: link.audience,
      people: link.people,
      shows: link.shows,
      blind: link.blind,
      hidesReferees: link.hidesReferees,
      allowsRemarks: link.allowsRemarks,
      visitLimit: link.visitLimit,
      expiresAt: link.expiresAt,
      revokedAt: link.revokedAt,
      visits: sql<number>`(select count(*) from ${linkVisit}
        where ${linkVisit.linkId} = ${link.id} and ${linkVisit.outcome} = 'opened')`,
      /** The report or its dataset was put aside. */
      gone: sql<number>`(${report.deletedAt} is not null or ${dataset.deletedAt} is not null)`,
      team: team.name,
      teamSlug: team.slug,
      madeBy: person.name,
      counts: dataset.counts,
      number: report.number,
      madeAt: report.createdAt,
      engineVersion: report.engineVersion,
      document: report.document,
      sha256: report.sha256,
      options: report.options,
      conditions: report.conditions
    })
    .from(link)
    .innerJoin(team, eq(team.id, link.teamId))
    .innerJoin(report, eq(report.id, link.reportId))
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(eq(link.tokenHash, tokenHash))
    .get();
}

export type FoundLink = NonNullable<ReturnType<typeof findLink>>;
