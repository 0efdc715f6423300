import { and, eq, isNotNull, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person } from '../../db/schema';

/**
 * Whether a link is meant for somebody: null when it is, else why not. A named person must have shown the address to
 * be theirs: anybody can type one when signing up.
 */
export function isMeant(
  db: Pick<Database, 'select'>,
  link: { audience: 'anyone' | 'named' | 'team'; people: string; teamId: string },
  personId: string | null
): 'sign-in' | 'not-named' | 'not-in-team' | null {
  if (link.audience === 'anyone') return null;
  if (personId === null) return 'sign-in';
  if (link.audience === 'named') {
    const found = db
      .select({ email: person.email })
      .from(person)
      .where(and(eq(person.id, personId), isNull(person.disabledAt), isNotNull(person.emailVerifiedAt)))
      .get();
    const named = JSON.parse(link.people) as string[];
    return found && named.includes(found.email) ? null : 'not-named';
  }
  const member = db
    .select({ id: membership.personId })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(
      and(eq(membership.teamId, link.teamId), eq(membership.personId, personId), isNull(person.disabledAt))
    )
    .get();
  return member ? null : 'not-in-team';
}
