import { ROLES, type Role } from '$lib/model/team/roles';
import { apiToken, dataset, event, membership } from '$lib/server/db/schema';
import { mayWhere } from '$lib/server/services/access/may-where';
import { disablePerson, enablePerson } from '$lib/server/services/people/disable-person';
import { removeMember } from '$lib/server/services/teams/remove-member';
import { listTokens } from '$lib/server/services/tokens/list-tokens';
import { makeToken } from '$lib/server/services/tokens/make-token';
import { openToken } from '$lib/server/services/tokens/open-token';
import { revokeToken } from '$lib/server/services/tokens/revoke-token';
import { person } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { and, eq } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import { beforeEach, describe, expect, it } from 'vitest';
import { makeDataset } from '../../../../support/datasets';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const NOW = Date.UTC(2026, 2, 14, 15, 9, 26);
const DAY = 86_400_000;
const form = { name: 'nightly upload', role: 'observer' as Role, scopes: ['read' as const], days: 30 };

let db: ReturnType<typeof freshDatabase>;
let teamId: string;
let lead: Actor;

beforeEach(() => {
  db = freshDatabase();
  teamId = makeTeam(db).id;
  lead = makeMember(db, teamId, 'lead');
});

function made(actor: Actor, more: Partial<typeof form> = {}, now = NOW): { id: string; token: string } {
  const result = makeToken(db, actor, { ...form, ...more }, now);
  if (!result.ok) throw new Error(result.reason);
  return result;
}
const emailOf = (id: string) => db.select().from(person).where(eq(person.id, id)).get()!.email;

describe('a token', () => {
  it('is 256 random bits behind a name to recognise it by, of which only the sha256 is kept', () => {
    const { token, id } = made(lead);
    expect(token).toMatch(/^sev_[a-z2-9]{8}_[A-Za-z0-9_-]{43}$/);
    expect(Buffer.from(token.slice(13), 'base64url')).toHaveLength(32);
    const row = db.select().from(apiToken).where(eq(apiToken.id, id)).get();
    expect(row?.tokenHash).toBe(createHash('sha256').update(token).digest('hex'));
    expect(row?.hint).toBe(token.slice(0, 12));
    const everything = JSON.stringify([db.select().from(apiToken).all(), db.select().from(event).all()]);
    expect(everything).not.toContain(token.slice(13));
  });

  it('opens its team, acting for its maker, until its day', () => {
    const { token, id } = made(lead);
    const opened = openToken(db, token, NOW);
    expect(opened).toMatchObject({ ok: true, team: { id: teamId }, scopes: ['read'] });
    expect(opened.ok && opened.actor).toEqual({
      personId: lead.personId,
      teamId,
      role: 'observer',
      token: { id, name: 'nightly upload', role: 'observer' }
    });
    expect(openToken(db, token, NOW + 30 * DAY - 1).ok).toBe(true);
    expect(openToken(db, token, NOW + 30 * DAY).ok).toBe(false);
  });

  it('refuses what was never one in the same way', () => {
    const { token } = made(lead);
    const wrong = token.slice(0, -1) + (token.endsWith('A') ? 'B' : 'A');
    for (const text of ['', 'sev_', wrong, token.toUpperCase(), ` ${token}`, token.slice(13)])
      expect(openToken(db, text, NOW)).toEqual({ ok: false });
  });

  it('notes the day of its last use and no hour', () => {
    const { token, id } = made(lead);
    expect(listTokens(db, lead, NOW)[0].lastUsedOn).toBeNull();
    openToken(db, token, NOW + 5);
    openToken(db, token, NOW + 6);
    expect(listTokens(db, lead, NOW)[0]).toMatchObject({ id, lastUsedOn: Date.UTC(2026, 2, 14) });
    openToken(db, token, NOW + DAY);
    expect(listTokens(db, lead, NOW)[0].lastUsedOn).toBe(Date.UTC(2026, 2, 15));
  });
});

describe('the role of a token', () => {
  it('is at most that of its maker when it is made', () => {
    for (const own of ROLES)
      for (const role of ROLES) {
        const result = makeToken(db, makeMember(db, teamId, own), { ...form, role }, NOW);
        const fits = ROLES.indexOf(role) >= ROLES.indexOf(own);
        expect(result.ok ? 'made' : result.reason, `${own} makes ${role}`).toBe(fits ? 'made' : 'above-you');
      }
  });

  it('narrows with its maker, and never widens', () => {
    const { token } = made(lead, { role: 'experimenter' });
    const roleOf = () => {
      const opened = openToken(db, token, NOW);
      return opened.ok ? opened.actor.role : null;
    };
    expect(roleOf()).toBe('experimenter');
    db.update(membership).set({ role: 'observer' }).where(eq(membership.personId, lead.personId)).run();
    expect(roleOf()).toBe('observer');
    db.update(membership).set({ role: 'lead' }).where(eq(membership.personId, lead.personId)).run();
    expect(roleOf()).toBe('experimenter');
  });

  it('binds the services too, whatever a route asked: a lead’s observer token finds nothing to delete', () => {
    makeDataset(db, lead, { createdBy: lead.personId });
    const found = (role: Role, action: 'see' | 'upload' | 'delete' | 'manage') => {
      const actor = { ...lead, token: { id: 't', name: 't', role } };
      const where = mayWhere(actor, action, dataset.teamId, dataset.createdBy);
      return db.select().from(dataset).where(where).all().length;
    };
    expect([found('lead', 'delete'), found('lead', 'manage')]).toEqual([1, 1]);
    expect([found('experimenter', 'delete'), found('experimenter', 'manage')]).toEqual([1, 0]);
    expect([found('observer', 'see'), found('observer', 'upload'), found('observer', 'delete')]).toEqual([
      1, 0, 0
    ]);
    // An experimenter's token of a lead may delete what is the lead's own, and nothing else.
    db.update(dataset).set({ createdBy: null }).run();
    expect([found('lead', 'delete'), found('experimenter', 'delete')]).toEqual([1, 0]);
  });
});

describe('a token dies', () => {
  it('with the membership of its maker, and stays dead when they come back', () => {
    const { personId } = makeMember(db, teamId, 'experimenter');
    const { token } = made({ personId, teamId, role: 'experimenter' });
    expect(removeMember(db, lead, personId).ok).toBe(true);
    expect(openToken(db, token, NOW).ok).toBe(false);
    db.insert(membership)
      .values({ teamId, personId, role: 'experimenter', createdAt: NOW + 1 })
      .run();
    expect(openToken(db, token, NOW + 2).ok).toBe(false);
    expect(listTokens(db, lead, NOW + 2)[0].state).toBe('ended');
  });

  it('when its maker is disabled, and stays dead when they are enabled again', () => {
    const { token } = made(lead);
    disablePerson(db, emailOf(lead.personId), NOW);
    expect(openToken(db, token, NOW).ok).toBe(false);
    enablePerson(db, emailOf(lead.personId), NOW);
    expect(openToken(db, token, NOW).ok).toBe(false);
  });

  it('when it is revoked: by its maker or a lead, by nobody else', () => {
    const [own, other] = [makeMember(db, teamId, 'observer'), makeMember(db, teamId, 'experimenter')];
    const stranger = makeMember(db, makeTeam(db).id, 'lead');
    const [first, second] = [made(own), made(own)];
    for (const actor of [other, stranger, { ...stranger, teamId }])
      expect(revokeToken(db, actor, first.id, NOW)).toEqual({ ok: false, reason: 'unknown' });
    expect(openToken(db, first.token, NOW).ok).toBe(true);
    expect(revokeToken(db, own, first.id, NOW).ok).toBe(true);
    expect(revokeToken(db, lead, second.id, NOW).ok).toBe(true);
    expect(revokeToken(db, lead, second.id, NOW + 9).ok).toBe(true);
    expect([first, second].map(({ token }) => openToken(db, token, NOW).ok)).toEqual([false, false]);
    const told = db
      .select()
      .from(event)
      .where(and(eq(event.teamId, teamId), eq(event.action, 'token.revoke')))
      .all();
    expect(told.map(({ thing }) => thing)).toEqual([first.id, second.id]);
  });

  it('is listed for leads whoever made it, for the others if it is theirs', () => {
    const [own, other] = [makeMember(db, teamId, 'observer'), makeMember(db, teamId, 'observer')];
    made(own);
    made(lead);
    expect([lead, own, other].map((actor) => listTokens(db, actor, NOW).length)).toEqual([2, 1, 0]);
  });
});
