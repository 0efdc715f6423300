import { slugOfName } from '$lib/model/team/slug-of-name';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { membership, person, team } from '../../db/schema';
import { recordEvent } from '../events/record-event';

/** Words that an address may come to need for itself, or that would pass for the program's own voice. */
const RESERVED = new Set(
  (
    'account admin api auth demo-team export help import invitation invitations link links mail me new null ' +
    'outbox password settings severalty sign-in sign-out support system team teams undefined www'
  ).split(' ')
);

export type MakeTeam =
  | { ok: true; team: { id: string; slug: string; name: string } }
  /** `no-slug`: the name has no letters that an address takes, and no slug was given. */
  | { ok: false; reason: 'taken' | 'reserved' | 'no-slug'; slug: string };

/** Makes a team; who makes it is its lead. */
export function makeTeam(
  db: Database,
  personId: string,
  { name, slug = '' }: { name: string; slug?: string },
  now = Date.now()
): MakeTeam {
  const made = { id: newId(), slug: slug || slugOfName(name), name };
  if (made.slug === '') return { ok: false, reason: 'no-slug', slug: '' };
  if (RESERVED.has(made.slug)) return { ok: false, reason: 'reserved', slug: made.slug };
  return db.transaction(
    (tx): MakeTeam => {
      const { changes } = tx
        .insert(team)
        .values({ ...made, createdAt: now })
        .onConflictDoNothing({ target: team.slug })
        .run();
      if (changes === 0) return { ok: false, reason: 'taken', slug: made.slug };
      const lead = tx.select({ id: person.id }).from(person).where(eq(person.id, personId)).get();
      if (!lead) throw new Error('A team is made by somebody who exists.');
      tx.insert(membership).values({ teamId: made.id, personId, role: 'lead', createdAt: now }).run();
      recordEvent(tx, { action: 'team.make', teamId: made.id, personId, thing: made.id }, now);
      return { ok: true, team: made };
    },
    { behavior: 'immediate' }
  );
}
