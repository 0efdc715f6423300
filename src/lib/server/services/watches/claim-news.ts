import { and, asc, eq, inArray, isNull, ne, or, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event, link, membership, person, team, watch } from '../../db/schema';
import { newerEvents } from '../events/newer-events';
import { newestEvent } from '../events/newest-event';
import { isTellingTime } from './due';
import { ALL_WATCHED_ACTIONS, kindOf, readAbout } from './watch-about';

type Tx = Pick<Database, 'select' | 'update' | 'delete'>;

/** An event that somebody wants to hear of, with what decides how its person is named. */
export type NewsEvent = ReturnType<typeof eventsFor>[number];

/** What there is to tell somebody of one team, and how the watch stood before. */
export interface TeamNews {
  teamId: string;
  slug: string;
  name: string;
  events: NewsEvent[];
  before: { lastEvent: number; lastDigestAt: number | null };
  claimed: number;
}

export interface News {
  personId: string;
  email: string;
  teams: TeamNews[];
}

/**
 * What is to be told to one person now, marked as told in the same transaction: of two processes one gets it. Who is no
 * member any more loses the watch; who is disabled is told nothing, then or later.
 */
export function claimNews(db: Database, personId: string, hour: number, now: number): News | null {
  return db.transaction(
    (tx): News | null => {
      const rows = tx
        .select({
          watch,
          slug: team.slug,
          name: team.name,
          email: person.email,
          disabledAt: person.disabledAt,
          role: membership.role
        })
        .from(watch)
        .innerJoin(team, eq(team.id, watch.teamId))
        .innerJoin(person, eq(person.id, watch.personId))
        .leftJoin(
          membership,
          and(eq(membership.teamId, watch.teamId), eq(membership.personId, watch.personId))
        )
        .where(eq(watch.personId, personId))
        .orderBy(asc(team.name))
        .all();
      const newest = newestEvent(tx);
      const teams: TeamNews[] = [];
      for (const { watch: mine, slug, name, disabledAt, role } of rows) {
        const row = and(eq(watch.personId, personId), eq(watch.teamId, mine.teamId));
        if (role === null) {
          tx.delete(watch).where(row).run();
          continue;
        }
        if (!isTellingTime(mine, now, hour)) continue;
        const events = disabledAt === null ? eventsFor(tx, mine) : [];
        const daily = mine.rhythm === 'daily';
        tx.update(watch)
          .set({ lastEvent: newest, ...(daily || events.length > 0 ? { lastDigestAt: now } : {}) })
          .where(row)
          .run();
        const { teamId, lastEvent, lastDigestAt } = mine;
        if (events.length > 0)
          teams.push({ teamId, slug, name, events, before: { lastEvent, lastDigestAt }, claimed: newest });
      }
      return teams.length > 0 ? { personId, email: rows[0].email, teams } : null;
    },
    { behavior: 'immediate' }
  );
}

/** Gives back what could not be sent, unless somebody else has told something since. */
export function giveBackNews(db: Database, { personId, teams }: News): void {
  for (const { teamId, before, claimed } of teams)
    db.update(watch)
      .set(before)
      .where(and(eq(watch.personId, personId), eq(watch.teamId, teamId), eq(watch.lastEvent, claimed)))
      .run();
}

/** Of one's own deeds nobody is told; but the end of a diagnosis is the program's, whoever asked for it. */
function eventsFor(tx: Tx, { personId, teamId, about, lastEvent }: typeof watch.$inferSelect) {
  const since = readAbout(about);
  return tx
    .select({
      id: event.id,
      action: event.action,
      thing: event.thing,
      detail: event.detail,
      linkId: event.linkId,
      personId: event.personId,
      name: person.name,
      hidden: link.hidesReferees
    })
    .from(event)
    .leftJoin(person, eq(person.id, event.personId))
    .leftJoin(link, eq(link.id, event.linkId))
    .where(
      and(
        newerEvents(teamId, lastEvent),
        inArray(event.action, ALL_WATCHED_ACTIONS),
        or(eq(event.action, 'report.make'), isNull(event.personId), ne(event.personId, personId))
      )
    )
    .orderBy(asc(event.id))
    .all()
    .filter(({ id, action }) => id > (since[kindOf(action)!] ?? Infinity));
}

/** People who may be told something now. Looked at without a write, since most looks find nothing. */
export function peopleToTell(db: Database, hour: number, now: number): string[] {
  const rows = db
    .select({
      personId: watch.personId,
      rhythm: watch.rhythm,
      lastDigestAt: watch.lastDigestAt,
      updatedAt: watch.updatedAt
    })
    .from(watch)
    .where(
      or(
        eq(watch.rhythm, 'daily'),
        sql`exists (select 1 from ${event} where ${newerEvents(watch.teamId, watch.lastEvent)})`
      )
    )
    .all();
  return [...new Set(rows.filter((row) => isTellingTime(row, now, hour)).map(({ personId }) => personId))];
}
