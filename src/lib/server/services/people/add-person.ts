import type { Role } from '$lib/model/team/roles';
import { eq } from 'drizzle-orm';
import { insertPerson } from '../../auth/insert-person';
import { normalEmail } from '../../auth/normal-email';
import { hashPassword } from '../../auth/password-hash';
import type { Database } from '../../db/client';
import { membership, person, team } from '../../db/schema';
import { recordEvent } from '../events/record-event';

export interface Added {
  email: string;
  name: string;
  password: string;
  /** Team to put them in, and as what. */
  member?: { slug: string; role: Role };
}

export type AddPerson =
  /** `made`: false when they had an account already, which keeps its name and password. */
  { ok: true; made: boolean } | { ok: false; reason: 'unknown-team' | 'member-already' };

/** Adds somebody, and puts them into a team: what whoever runs the server does by hand. */
export async function addPerson(
  db: Database,
  { email, name, password, member }: Added,
  now = Date.now()
): Promise<AddPerson> {
  const passwordHash = await hashPassword(password);
  return db.transaction(
    (tx): AddPerson => {
      const into = member && tx.select().from(team).where(eq(team.slug, member.slug)).get();
      if (member && !into) return { ok: false, reason: 'unknown-team' };
      // Whoever runs the server vouches for the address.
      const made = insertPerson(tx, { email, name, passwordHash, verified: true }, now);
      const { id } =
        made ??
        tx
          .select()
          .from(person)
          .where(eq(person.email, normalEmail(email)))
          .get()!;
      if (made) recordEvent(tx, { action: 'person.add', personId: id, detail: { by: 'command' } }, now);
      if (member && into) {
        const { changes } = tx
          .insert(membership)
          .values({ teamId: into.id, personId: id, role: member.role, createdAt: now })
          .onConflictDoNothing()
          .run();
        if (changes === 0) return { ok: false, reason: 'member-already' };
        recordEvent(
          tx,
          { action: 'member.add', teamId: into.id, thing: id, detail: { role: member.role, by: 'command' } },
          now
        );
      }
      return { ok: true, made: made !== null };
    },
    { behavior: 'immediate' }
  );
}
