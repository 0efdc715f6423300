import { and, eq, gt, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { linkVisit } from '../../db/schema';

/** Refusals of one person, or of strangers, within a minute are one line: a closed link that is hammered fills no disk. */
const REFUSED_ONCE_IN = 60_000;

/** Adds a line to a link's log. @returns its id */
export function noteVisit(
  db: Pick<Database, 'select' | 'insert'>,
  linkId: string,
  personId: string | null,
  outcome: 'opened' | 'refused',
  now: number
): string {
  if (outcome === 'refused') {
    const before = db
      .select({ id: linkVisit.id })
      .from(linkVisit)
      .where(
        and(
          eq(linkVisit.linkId, linkId),
          eq(linkVisit.outcome, 'refused'),
          gt(linkVisit.at, now - REFUSED_ONCE_IN),
          personId === null ? isNull(linkVisit.personId) : eq(linkVisit.personId, personId)
        )
      )
      .get();
    if (before) return before.id;
  }
  const id = newId();
  db.insert(linkVisit).values({ id, linkId, at: now, personId, outcome }).run();
  return id;
}
