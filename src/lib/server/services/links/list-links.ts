import { linkState } from '$lib/model/link/link-state';
import type { TeamLink } from '$lib/model/link/team-link';
import { and, desc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { link, linkVisit } from '../../db/schema';
import type { Actor } from '../access/actor';
import { dayOf } from './day-of';
import { linkable, linksOf, type Opens } from './linkable';

export type ListedLinks = { ok: true; links: TeamLink[] } | { ok: false; reason: 'unknown' | 'not-allowed' };

/**
 * Links of a report or sweep, the newest first, with how they stand and how often they were opened; when last, to the day alone
 * where the link hides its referees, as in its log.
 */
export function listLinks(db: Database, actor: Actor, opens: Opens, now = Date.now()): ListedLinks {
  const found = linkable(db, actor, opens);
  if (!found.ok) return found;
  const of = (outcome: 'opened' | 'refused') =>
    sql<number>`count(case when ${linkVisit.outcome} = ${outcome} then 1 end)`;
  const rows = db
    .select({
      id: link.id,
      label: link.label,
      audience: link.audience,
      people: link.people,
      shows: link.shows,
      blind: link.blind,
      hidesReferees: link.hidesReferees,
      allowsRemarks: link.allowsRemarks,
      visitLimit: link.visitLimit,
      expiresAt: link.expiresAt,
      revokedAt: link.revokedAt,
      createdAt: link.createdAt,
      visits: of('opened'),
      refused: of('refused'),
      lastVisitAt: sql<number | null>`max(case when ${linkVisit.outcome} = 'opened' then ${linkVisit.at} end)`
    })
    .from(link)
    .leftJoin(linkVisit, eq(linkVisit.linkId, link.id))
    .where(and(linksOf(opens), eq(link.teamId, actor.teamId)))
    .groupBy(link.id)
    .orderBy(desc(link.createdAt), desc(link.id))
    .all();
  return {
    ok: true,
    links: rows.map((row) => ({
      ...row,
      people: JSON.parse(row.people) as string[],
      lastVisitAt: row.hidesReferees && row.lastVisitAt !== null ? dayOf(row.lastVisitAt) : row.lastVisitAt,
      state: linkState(row, row.visits, now)
    }))
  };
}
