import { and, desc, eq, isNotNull, isNull, like, lt, or, type SQL } from 'drizzle-orm';
import { eventWords } from '$lib/model/team/event-words';
import type { Database } from '../../db/client';
import { event, link, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { thingName } from './thing-name';

export interface ListedEvent {
  id: number;
  at: number;
  action: string;
  words: string;
}

export interface EventFilter {
  action?: string;
  personId?: string;
  /** Events before this one: the `next` of the page before. */
  before?: number;
}

export interface EventPage {
  events: ListedEvent[];
  /** For `before` of the next page; null when this is the last. */
  next: number | null;
}

export const EVENTS_A_PAGE = 50;

/**
 * What happened in the team, newest first; for leads alone. Paged by the number of the event, so that what happens
 * meanwhile moves nothing. Who came by a link that hides its referees is not named, and not found by their name.
 */
export function listEvents(
  db: Database,
  actor: Actor,
  filter: EventFilter = {},
  most = EVENTS_A_PAGE
): EventPage {
  const rows = db
    .select({
      id: event.id,
      at: event.at,
      action: event.action,
      thing: event.thing,
      detail: event.detail,
      linkId: event.linkId,
      name: person.name,
      personId: event.personId,
      hidden: link.hidesReferees
    })
    .from(event)
    .leftJoin(person, eq(person.id, event.personId))
    .leftJoin(link, eq(link.id, event.linkId))
    .where(
      and(
        mayWhere(actor, 'manage', event.teamId),
        filter.action === undefined ? undefined : eq(event.action, filter.action),
        filter.personId === undefined ? undefined : and(eq(event.personId, filter.personId), namable()),
        filter.before === undefined ? undefined : lt(event.id, filter.before)
      )
    )
    .orderBy(desc(event.id))
    .limit(most + 1)
    .all();
  const events = rows.slice(0, most).map(({ id, at, action, thing, detail: text, ...by }) => {
    const detail =
      text === null ? {} : (JSON.parse(text) as Record<string, string | number | boolean | null>);
    const who = nameOf(action, by);
    const words = eventWords({
      action,
      who,
      thing: thingName(db, actor.teamId, { action, thing, detail, linkId: by.linkId }),
      detail
    });
    return { id, at, action, words };
  });
  return { events, next: rows.length > most ? events[events.length - 1].id : null };
}

/** Links are made and revoked by members, who are named; everything else with a link came through it. */
const cameByLink = (action: string) => !action.startsWith('link.');

/**
 * How who did something is called, as far as the team may know; null for the program itself. A link that is gone cannot
 * say any more whether it hid its referees, so it is taken to have.
 */
export function nameOf(
  action: string,
  by: {
    name: string | null;
    personId: string | null;
    linkId: string | null;
    hidden: boolean | null;
  }
): string | null {
  const byLink = cameByLink(action) && by.linkId !== null;
  if (byLink && by.hidden !== false) return 'A referee';
  if (by.name !== null) return by.name;
  if (byLink) return 'Somebody with a link';
  return by.personId === null ? null : 'Somebody who is gone';
}

/** Events whose person the team may know; see nameOf. */
export function namable(): SQL | undefined {
  return or(
    like(event.action, 'link.%'),
    isNull(event.linkId),
    and(isNotNull(link.id), eq(link.hidesReferees, false))
  );
}
