import { and, eq } from 'drizzle-orm';
import { event, membership, person } from '$lib/server/db/schema';
import { acceptInvitation } from '$lib/server/services/invitations/accept-invitation';
import { INVITATION_LIFE } from '$lib/server/services/invitations/life';
import { readInvitation } from '$lib/server/services/invitations/read-invitation';
import { resendInvitation } from '$lib/server/services/invitations/resend-invitation';
import { revokeInvitation } from '$lib/server/services/invitations/revoke-invitation';
import { describe, expect, it } from 'vitest';
import { makePerson } from '../../../../support/people';
import { addressOf, invited, mailedToken, setting } from './setting';

const MINUTE = 60_000;

describe('acceptInvitation', () => {
  it('makes the invited person a member, once', async () => {
    const all = setting();
    const { db, team } = all;
    const { guest, id, token } = await invited(all, 1000);
    expect(readInvitation(db, token, null, 2000)).toMatchObject({
      ok: true,
      fit: 'signed-out',
      invitation: { email: guest.email, role: 'experimenter', teamName: team.name, by: 'Ada Invented' }
    });
    expect(readInvitation(db, token, guest.id, 2000)).toMatchObject({ ok: true, fit: 'ready' });
    expect(acceptInvitation(db, guest.id, token, 2000)).toEqual({ ok: true, teamSlug: team.slug });
    const theirs = and(eq(membership.teamId, team.id), eq(membership.personId, guest.id));
    expect(db.select().from(membership).where(theirs).get()).toMatchObject({
      role: 'experimenter',
      createdAt: 2000
    });
    expect(db.select().from(event).where(eq(event.action, 'invitation.accept')).all()).toMatchObject([
      { personId: guest.id, teamId: team.id, thing: id }
    ]);
    expect(acceptInvitation(db, guest.id, token, 3000)).toEqual({ ok: false, reason: 'used' });
    expect(readInvitation(db, token, guest.id, 3000)).toEqual({
      ok: false,
      reason: 'used',
      teamSlug: team.slug
    });
    // Whoever else finds the address learns no name of a team.
    expect(readInvitation(db, token, null, 3000)).toEqual({ ok: false, reason: 'used', teamSlug: undefined });
    // Nor does it bring back somebody who was removed.
    db.delete(membership).where(theirs).run();
    expect(acceptInvitation(db, guest.id, token, 4000)).toEqual({ ok: false, reason: 'used' });
  });

  it('takes the right address, and shown to be theirs', async () => {
    const all = setting();
    const { db, lead } = all;
    const { guest, token } = await invited(all, 1000, false);
    const other = makePerson(db, 'Cy Invented');
    expect(acceptInvitation(db, other.id, token, 2000)).toEqual({ ok: false, reason: 'other-address' });
    expect(acceptInvitation(db, guest.id, token, 2000)).toEqual({ ok: false, reason: 'unverified' });
    expect(acceptInvitation(db, lead.personId, token, 2000)).toEqual({ ok: false, reason: 'member' });
    expect(acceptInvitation(db, 'nobody', token, 2000)).toEqual({ ok: false, reason: 'signed-out' });
    db.update(person).set({ emailVerifiedAt: 5 }).where(eq(person.id, guest.id)).run();
    expect(acceptInvitation(db, guest.id, token, 2000).ok).toBe(true);
  });

  it('says so when it has run out, to the millisecond', async () => {
    const all = setting();
    const { guest, token } = await invited(all, 1000);
    const end = 1000 + INVITATION_LIFE;
    expect(acceptInvitation(all.db, guest.id, token, end)).toEqual({ ok: false, reason: 'expired' });
    expect(acceptInvitation(all.db, guest.id, token, end - 1).ok).toBe(true);
  });

  it.each(['', 'x', 'x'.repeat(43), '../../etc'])('knows no token %j', (token) => {
    const { db, lead } = setting();
    expect(acceptInvitation(db, lead.personId, token)).toEqual({ ok: false, reason: 'unknown' });
  });
});

describe('revokeInvitation', () => {
  it('ends it, and is for leads of the team alone', async () => {
    const all = setting();
    const { db, team, lead, experimenter, stranger } = all;
    const { guest, id, token } = await invited(all, 1000);
    for (const actor of [experimenter, stranger, { ...stranger, teamId: team.id }])
      expect(revokeInvitation(db, actor, id, 1500)).toEqual({ ok: false, reason: 'unknown' });
    expect(revokeInvitation(db, lead, id, 1500)).toEqual({ ok: true, email: guest.email });
    expect(revokeInvitation(db, lead, id, 1600)).toEqual({ ok: true, email: guest.email });
    expect(acceptInvitation(db, guest.id, token, 2000)).toEqual({ ok: false, reason: 'revoked' });
    expect(db.select().from(event).where(eq(event.action, 'invitation.revoke')).all()).toHaveLength(1);
  });

  it('comes too late for one that was accepted', async () => {
    const all = setting();
    const { guest, id, token } = await invited(all, 1000);
    acceptInvitation(all.db, guest.id, token, 2000);
    expect(revokeInvitation(all.db, all.lead, id)).toEqual({ ok: false, reason: 'accepted' });
  });
});

describe('resendInvitation', () => {
  it('makes a new token, ends the old one, and begins another 14 days', async () => {
    const all = setting();
    const { db, lead } = all;
    const { guest, id, token } = await invited(all, 1000);
    const again = (now: number) => resendInvitation(db, lead, id, addressOf, now);
    expect(await again(1000 + MINUTE - 1)).toEqual({ ok: false, reason: 'too-soon' });
    // Also one that has run out.
    const late = 2000 + INVITATION_LIFE;
    expect(await again(late)).toMatchObject({ ok: true, mailed: true, email: guest.email });
    const fresh = mailedToken(db);
    expect(fresh).not.toBe(token);
    expect(acceptInvitation(db, guest.id, token, late)).toEqual({ ok: false, reason: 'unknown' });
    expect(acceptInvitation(db, guest.id, fresh, late + INVITATION_LIFE - 1).ok).toBe(true);
    expect(await again(late + MINUTE)).toEqual({ ok: false, reason: 'unknown' });
  });

  it('is for leads of the team alone, and not for what was revoked', async () => {
    const all = setting();
    const { db, team, lead, experimenter, stranger } = all;
    const { id } = await invited(all, 1000);
    for (const actor of [experimenter, stranger, { ...stranger, teamId: team.id }])
      expect(await resendInvitation(db, actor, id, addressOf)).toEqual({ ok: false, reason: 'unknown' });
    revokeInvitation(db, lead, id);
    expect(await resendInvitation(db, lead, id, addressOf)).toEqual({ ok: false, reason: 'unknown' });
  });
});
