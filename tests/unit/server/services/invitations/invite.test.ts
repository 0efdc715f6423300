import { event, invitation } from '$lib/server/db/schema';
import { invitations } from '$lib/server/services/invitations/invitations';
import { invite } from '$lib/server/services/invitations/invite';
import { INVITATION_LIFE, MOST_OPEN } from '$lib/server/services/invitations/life';
import { revokeInvitation } from '$lib/server/services/invitations/revoke-invitation';
import { eq } from 'drizzle-orm';
import { person } from '$lib/server/db/schema';
import { describe, expect, it, vi } from 'vitest';
import { addressOf, mailedToken, outbox, setting } from './setting';

const DAY = 24 * 60 * 60 * 1000;

describe('invite', () => {
  it('mails a token that is good for 14 days, and keeps only its sha256', async () => {
    const { db, team, lead } = setting();
    const made = await invite(db, lead, { email: ' Bo@Example.org ', role: 'observer' }, addressOf, 1000);
    expect(made).toMatchObject({ ok: true, mailed: true });
    const [mail] = outbox(db);
    expect(mail).toMatchObject({
      to: 'bo@example.org',
      subject: `Ada Invented invites you to ${team.name}`
    });
    expect(mail.text).toMatch(/as an observer/);
    const token = mailedToken(db);
    // 32 bytes in base64url are 43 characters.
    expect(token).toMatch(/^[\w-]{43}$/);
    const [row] = db.select().from(invitation).all();
    expect(row).toMatchObject({ email: 'bo@example.org', role: 'observer', expiresAt: 1000 + 14 * DAY });
    expect(row.tokenHash).toMatch(/^[0-9a-f]{64}$/);
    const kept = JSON.stringify([db.select().from(invitation).all(), db.select().from(event).all()]);
    expect(kept).not.toContain(token);
  });

  it('tells of a member and of an open invitation instead of sending another', async () => {
    const { db, lead, experimenter } = setting();
    const [{ email }] = db.select().from(person).where(eq(person.id, experimenter.personId)).all();
    const asked = (address: string, now = 1000) =>
      invite(db, lead, { email: address, role: 'lead' }, addressOf, now);
    expect(await asked(email.toUpperCase())).toEqual({ ok: false, reason: 'member' });
    expect((await asked('bo@example.org')).ok).toBe(true);
    expect(await asked('BO@example.org', 2000)).toEqual({ ok: false, reason: 'invited' });
    expect(outbox(db)).toHaveLength(1);
    // After it ran out the address can be invited anew, and stands in the list once.
    expect((await asked('bo@example.org', 1000 + INVITATION_LIFE)).ok).toBe(true);
    expect(invitations(db, lead, 2000 + INVITATION_LIFE)).toMatchObject([
      { email: 'bo@example.org', expired: false, by: 'Ada Invented' }
    ]);
  });

  it('is for leads of the team alone, as is the list', async () => {
    const { db, team, lead, experimenter, stranger } = setting();
    await invite(db, lead, { email: 'bo@example.org', role: 'lead' }, addressOf);
    for (const actor of [experimenter, { ...stranger, teamId: team.id }]) {
      const answer = await invite(db, actor, { email: 'cy@example.org', role: 'lead' }, addressOf);
      expect(answer).toEqual({ ok: false, reason: 'not-allowed' });
      expect(invitations(db, actor)).toEqual([]);
    }
    expect(invitations(db, stranger)).toEqual([]);
    expect(outbox(db)).toHaveLength(1);
  });

  it(`stops at ${MOST_OPEN} open ones`, async () => {
    const { db, lead } = setting();
    const one = (i: number) => invite(db, lead, { email: `p${i}@example.org`, role: 'observer' }, addressOf);
    for (let i = 0; i < MOST_OPEN; i++) expect((await one(i)).ok).toBe(true);
    expect(await one(MOST_OPEN)).toEqual({ ok: false, reason: 'too-many' });
    revokeInvitation(db, lead, invitations(db, lead)[0].id);
    expect((await one(MOST_OPEN)).ok).toBe(true);
  });

  it('gives the address to the lead when the mail did not go', async () => {
    const { db, lead } = setting();
    vi.stubEnv('ORIGIN', 'https://lab.example.org');
    vi.stubEnv('SMTP_URL', '');
    const made = await invite(db, lead, { email: 'bo@example.org', role: 'observer' }, addressOf);
    vi.unstubAllEnvs();
    expect(made).toMatchObject({ ok: true, mailed: false });
    expect(outbox(db)).toEqual([]);
    expect('address' in made && made.address).toMatch(/^http:\/\/localhost\/invitation\/[\w-]{43}$/);
  });
});
