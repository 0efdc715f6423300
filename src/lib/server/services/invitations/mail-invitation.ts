import { ROLE_WORDS } from '$lib/model/team/members/role-words';
import type { Role } from '$lib/model/team/roles';
import { eq } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { person, team } from '../../db/schema';
import { sendMail } from '../../mail/send-mail';
import type { Actor } from '../access/actor';

export type Mailed =
  | { mailed: true }
  /** The mail did not go. The address is here, for the lead to pass on: it is kept nowhere else. */
  | { mailed: false; address: string };

/** Writes to the person who is invited. The address in it opens the invitation, and is in this mail alone. */
export async function mailInvitation(
  db: Database,
  actor: Actor,
  { email, role, address, expiresAt }: { email: string; role: Role; address: string; expiresAt: number }
): Promise<Mailed> {
  const from = db.select({ name: person.name }).from(person).where(eq(person.id, actor.personId)).get();
  const to = db.select({ name: team.name }).from(team).where(eq(team.id, actor.teamId)).get();
  const day = new Date(expiresAt).toISOString().slice(0, 10);
  const sent = await sendMail(db, {
    to: email,
    subject: `${from?.name ?? 'A lead'} invites you to ${to?.name ?? 'a team'}`,
    text: [
      `${from?.name ?? 'A lead'} invites you to join ${to?.name ?? 'a team'} on Severalty as ${ROLE_WORDS[role].article}.`,
      `Severalty asks whether counts of defects behave as a sum of independent events.`,
      `Open this address, sign in as ${email}, and accept:\n${address}`,
      `It is good until ${day}, and once. If you did not expect this, you need do nothing.`
    ].join('\n\n')
  });
  return sent.ok ? { mailed: true } : { mailed: false, address };
}
