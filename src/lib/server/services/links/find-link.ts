import { eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { link, linkVisit, team } from '../../db/schema';

/** The link of a token's hash, what it opens, and how often it was opened; undefined when there is none. */
export function findLink(db: Pick<Database, 'select'>, tokenHash: string) {
  return db
    .select({
      id: link.id,
      teamId: link.teamId,
      /** Exactly one of the two is set. */
      reportId: link.reportId,
      sweepId: link.sweepId,
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
      team: team.name,
      teamSlug: team.slug
    })
    .from(link)
    .innerJoin(team, eq(team.id, link.teamId))
    .where(eq(link.tokenHash, tokenHash))
    .get();
}

export type FoundLink = NonNullable<ReturnType<typeof findLink>>;
