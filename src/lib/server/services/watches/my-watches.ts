import type { MyWatch } from '$lib/model/watches/watch-form';
import { and, asc, eq, sql } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, team, watch } from '../../db/schema';
import { kindsOf, readAbout } from './watch-about';

/** Every team somebody is in, by name, with what they hear of it by mail. */
export function myWatches(db: Database, personId: string): MyWatch[] {
  return db
    .select({ slug: team.slug, team: team.name, about: watch.about, rhythm: watch.rhythm })
    .from(membership)
    .innerJoin(team, eq(team.id, membership.teamId))
    .leftJoin(watch, and(eq(watch.teamId, team.id), eq(watch.personId, membership.personId)))
    .where(eq(membership.personId, personId))
    .orderBy(asc(sql`lower(${team.name})`), asc(team.id))
    .all()
    .map(({ about, rhythm, ...rest }) => ({
      ...rest,
      about: about === null ? [] : kindsOf(readAbout(about)),
      rhythm: rhythm ?? 'at-once'
    }));
}
