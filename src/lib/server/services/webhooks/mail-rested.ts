import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { membership, person, team, webhook } from '../../db/schema';
import { sendMail, type Message, type SendMail } from '../../mail/send-mail';

/**
 * Tells who made a webhook that it was put to rest after a week of failures; where they no longer lead the team, those
 * who do.
 *
 * @param origin address of the application
 * @returns how many messages could not be sent
 */
export async function mailRested(
  db: Database,
  webhookId: string,
  origin: string,
  send: (db: Database, message: Message) => Promise<SendMail> = sendMail
): Promise<number> {
  const found = db
    .select({ webhook, slug: team.slug, team: team.name })
    .from(webhook)
    .innerJoin(team, eq(team.id, webhook.teamId))
    .where(eq(webhook.id, webhookId))
    .get();
  if (!found) return 0;
  const { name, restingWhy, createdBy, teamId } = found.webhook;
  const leads = db
    .select({ id: person.id, email: person.email })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(and(eq(membership.teamId, teamId), eq(membership.role, 'lead'), isNull(person.disabledAt)))
    .all();
  const maker = leads.filter(({ id }) => id === createdBy);
  const sent = await Promise.all(
    (maker.length > 0 ? maker : leads).map(({ email }) =>
      send(db, {
        to: email,
        subject: `The webhook “${name}” was put to rest`,
        text: [
          `Nothing is sent any more to the webhook “${name}” of ${found.team}. ${restingWhy ?? ''}`.trim(),
          'What happens while it rests is not told later. Messages that wait are kept and sent when it is woken:',
          `${origin}/team/${found.slug}/webhooks/${webhookId}\n`
        ].join('\n\n')
      })
    )
  );
  return sent.filter(({ ok }) => !ok).length;
}
