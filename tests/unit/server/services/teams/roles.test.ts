import { and, eq } from 'drizzle-orm';
import type { Database } from '$lib/server/db/client';
import { event, membership, person } from '$lib/server/db/schema';
import { askTeam } from '$lib/server/services/access/ask-team';
import { changeRole } from '$lib/server/services/teams/change-role';
import { removeMember } from '$lib/server/services/teams/remove-member';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const other = makeTeam(db);
  return {
    db,
    team,
    lead: makeMember(db, team.id, 'lead'),
    experimenter: makeMember(db, team.id, 'experimenter'),
    stranger: makeMember(db, other.id, 'lead')
  };
}

const roleOf = (db: Database, teamId: string, personId: string) =>
  db
    .select({ role: membership.role })
    .from(membership)
    .where(and(eq(membership.teamId, teamId), eq(membership.personId, personId)))
    .get()?.role;

describe('changeRole', () => {
  it('changes a role, tells the events, and says nothing of what changed nothing', () => {
    const { db, team, lead, experimenter } = setting();
    expect(changeRole(db, lead, experimenter.personId, 'observer', 9)).toEqual({ ok: true });
    expect(changeRole(db, lead, experimenter.personId, 'observer', 10)).toEqual({ ok: true });
    expect(roleOf(db, team.id, experimenter.personId)).toBe('observer');
    expect(db.select().from(event).all()).toMatchObject([
      {
        at: 9,
        action: 'member.role',
        personId: lead.personId,
        thing: experimenter.personId,
        detail: '{"from":"experimenter","to":"observer"}'
      }
    ]);
  });

  it('keeps a lead: the last one steps down only after another was made', () => {
    const { db, team, lead, experimenter } = setting();
    expect(changeRole(db, lead, lead.personId, 'observer')).toEqual({ ok: false, reason: 'last-lead' });
    changeRole(db, lead, experimenter.personId, 'lead');
    expect(changeRole(db, lead, lead.personId, 'observer')).toEqual({ ok: true });
    expect(roleOf(db, team.id, lead.personId)).toBe('observer');
    // No lead any more, so no more changes from there.
    expect(changeRole(db, lead, experimenter.personId, 'observer')).toEqual({ ok: false, reason: 'unknown' });
  });

  it('does not count a lead who cannot sign in', () => {
    const { db, lead, experimenter } = setting();
    changeRole(db, lead, experimenter.personId, 'lead');
    db.update(person).set({ disabledAt: 1 }).where(eq(person.id, experimenter.personId)).run();
    expect(changeRole(db, lead, lead.personId, 'observer')).toEqual({ ok: false, reason: 'last-lead' });
  });

  it('knows nobody of another team, from either side', () => {
    const { db, team, lead, experimenter, stranger } = setting();
    expect(changeRole(db, lead, stranger.personId, 'observer')).toEqual({ ok: false, reason: 'unknown' });
    expect(changeRole(db, stranger, experimenter.personId, 'lead')).toEqual({ ok: false, reason: 'unknown' });
    const forged = { ...stranger, teamId: team.id };
    expect(changeRole(db, forged, experimenter.personId, 'lead')).toEqual({ ok: false, reason: 'unknown' });
    expect(changeRole(db, experimenter, experimenter.personId, 'lead')).toEqual({
      ok: false,
      reason: 'unknown'
    });
    expect(roleOf(db, team.id, experimenter.personId)).toBe('experimenter');
    expect(roleOf(db, stranger.teamId, stranger.personId)).toBe('lead');
  });
});

describe('removeMember', () => {
  it('ends access at once', () => {
    const { db, team, lead, experimenter } = setting();
    expect(askTeam(db, experimenter.personId, team.slug, 'see').ok).toBe(true);
    expect(removeMember(db, lead, experimenter.personId, 5)).toEqual({ ok: true });
    expect(askTeam(db, experimenter.personId, team.slug, 'see')).toEqual({ ok: false, reason: 'unknown' });
    expect(db.select().from(event).all()).toMatchObject([
      { at: 5, action: 'member.remove', personId: lead.personId, thing: experimenter.personId }
    ]);
  });

  it('lets anybody leave but the last lead', () => {
    const { db, team, lead, experimenter } = setting();
    expect(removeMember(db, lead, lead.personId)).toEqual({ ok: false, reason: 'last-lead' });
    expect(removeMember(db, experimenter, experimenter.personId)).toEqual({ ok: true });
    expect(db.select().from(event).all()).toMatchObject([{ action: 'member.leave' }]);
    expect(roleOf(db, team.id, lead.personId)).toBe('lead');
  });

  it('lets nobody but a lead of the team remove somebody else', () => {
    const { db, team, lead, experimenter, stranger } = setting();
    const observer = makeMember(db, team.id, 'observer');
    for (const actor of [experimenter, observer, stranger, { ...stranger, teamId: team.id }])
      for (const personId of [lead.personId, makeMember(db, team.id, 'observer').personId])
        expect(removeMember(db, actor, personId)).toEqual({ ok: false, reason: 'unknown' });
    expect(removeMember(db, lead, stranger.personId)).toEqual({ ok: false, reason: 'unknown' });
    expect(db.select().from(membership).all()).toHaveLength(8);
  });
});
