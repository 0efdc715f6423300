import { eq, sql } from 'drizzle-orm';
import type { Database } from '$lib/server/db/client';
import { outboxMessage, person } from '$lib/server/db/schema';
import { invite } from '$lib/server/services/invitations/invite';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makePerson, makeTeam } from '../../../../support/people';

export const addressOf = (token: string) => `http://localhost/invitation/${token}`;

/** A team with a lead and an experimenter, and a lead of another team. Mail goes to the outbox. */
export function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  return {
    db,
    team,
    lead: makeMember(db, team.id, 'lead'),
    experimenter: makeMember(db, team.id, 'experimenter'),
    stranger: makeMember(db, makeTeam(db).id, 'lead')
  };
}

/** Texts of the outbox, oldest first. */
export const outbox = (db: Database) =>
  db
    .select()
    .from(outboxMessage)
    .orderBy(sql`rowid`)
    .all();

/** The token in the last mail. */
export function mailedToken(db: Database): string {
  const last = outbox(db).at(-1)?.text ?? '';
  return /invitation\/([\w-]+)/.exec(last)?.[1] ?? '';
}

/** An invitation for somebody new, and its token. */
export async function invited(
  { db, lead }: Pick<ReturnType<typeof setting>, 'db' | 'lead'>,
  now: number,
  verified = true
) {
  const guest = makePerson(db, 'Bo Invented');
  if (!verified) db.update(person).set({ emailVerifiedAt: null }).where(eq(person.id, guest.id)).run();
  const made = await invite(db, lead, { email: guest.email, role: 'experimenter' }, addressOf, now);
  if (!made.ok) throw new Error(made.reason);
  return { guest, id: made.id, token: mailedToken(db) };
}
