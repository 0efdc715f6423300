import type { LinkVisit } from '$lib/model/link/team-link';
import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { link, linkVisit, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { dayOf } from './day-of';
import { linkable, linksOf, type Opens } from './linkable';

/** Lines of the log that one answer holds. */
const MOST = 200;

export type ListedVisits =
  { ok: true; visits: LinkVisit[] } | { ok: false; reason: 'unknown' | 'not-allowed' };

/**
 * The log of one link, the newest first, 200 lines at most. Where the link hides its referees nobody is named, and of
 * the time only the day is told: one named referee who opened a link at 22:14 is known by the hour.
 */
export function linkVisits(db: Database, actor: Actor, opens: Opens, linkId: string): ListedVisits {
  const found = linkable(db, actor, opens);
  if (!found.ok) return found;
  const entry = db
    .select({ hides: link.hidesReferees })
    .from(link)
    .where(and(eq(link.id, linkId), linksOf(opens), eq(link.teamId, actor.teamId)))
    .get();
  if (!entry) return { ok: false, reason: 'unknown' };
  const rows = db
    .select({ at: linkVisit.at, who: person.name, outcome: linkVisit.outcome })
    .from(linkVisit)
    .leftJoin(person, eq(person.id, linkVisit.personId))
    .where(eq(linkVisit.linkId, linkId))
    .orderBy(desc(linkVisit.at), desc(linkVisit.id))
    .limit(MOST)
    .all();
  return {
    ok: true,
    visits: entry.hides ? rows.map((row) => ({ ...row, at: dayOf(row.at), who: null })) : rows
  };
}
