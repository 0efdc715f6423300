import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { event, link, person } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { namable } from './list-events';

export interface EventFilters {
  actions: string[];
  people: { id: string; name: string }[];
}

/** Actions and people that occur in the team's events: what they can be filtered by. For leads alone. */
export function eventFilters(db: Database, actor: Actor): EventFilters {
  const ours = mayWhere(actor, 'manage', event.teamId);
  const actions = db
    .selectDistinct({ action: event.action })
    .from(event)
    .where(ours)
    .orderBy(asc(event.action))
    .all();
  const people = db
    .selectDistinct({ id: person.id, name: person.name })
    .from(event)
    .innerJoin(person, eq(person.id, event.personId))
    .leftJoin(link, eq(link.id, event.linkId))
    .where(and(ours, namable()))
    .orderBy(asc(sql`lower(${person.name})`), asc(person.id))
    .all();
  return { actions: actions.map(({ action }) => action), people };
}
