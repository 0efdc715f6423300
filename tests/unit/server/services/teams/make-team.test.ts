import { event, membership, team } from '$lib/server/db/schema';
import { makeTeam } from '$lib/server/services/teams/make-team';
import { myTeams } from '$lib/server/services/teams/my-teams';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makePerson, makeTeam as seedTeam } from '../../../../support/people';

describe('makeTeam', () => {
  it('makes its maker the lead, and is told in the events', () => {
    const db = freshDatabase();
    const { id } = makePerson(db);
    const made = makeTeam(db, id, { name: 'Küstenlabor 2' }, 5);
    expect(made).toMatchObject({ ok: true, team: { slug: 'kustenlabor-2', name: 'Küstenlabor 2' } });
    expect(db.select().from(membership).all()).toEqual([
      expect.objectContaining({ personId: id, role: 'lead', createdAt: 5 })
    ]);
    expect(db.select().from(event).all()).toEqual([
      expect.objectContaining({ action: 'team.make', personId: id })
    ]);
  });

  it('refuses a word in use, one that is kept, and a name without Latin letters, and leaves nothing', () => {
    const db = freshDatabase();
    const { id } = makePerson(db);
    seedTeam(db, 'bay-side');
    expect(makeTeam(db, id, { name: 'Bay Side' })).toEqual({ ok: false, reason: 'taken', slug: 'bay-side' });
    expect(makeTeam(db, id, { name: 'Other', slug: 'admin' })).toEqual({
      ok: false,
      reason: 'reserved',
      slug: 'admin'
    });
    expect(makeTeam(db, id, { name: '量子' })).toEqual({ ok: false, reason: 'no-slug', slug: '' });
    expect(makeTeam(db, id, { name: '量子', slug: 'ryoshi' }).ok).toBe(true);
    expect(db.select().from(team).all().length).toBe(2);
    expect(() => makeTeam(db, 'nobody', { name: 'Ghosts' })).toThrow();
    expect(db.select().from(team).all().length).toBe(2);
  });
});

describe('myTeams', () => {
  it('lists the teams of one person, by name, with the role', () => {
    const db = freshDatabase();
    const [a, b] = [seedTeam(db, 'zz-team'), seedTeam(db, 'aa-team')];
    const { personId } = makeMember(db, a.id, 'observer');
    makeMember(db, b.id, 'lead');
    expect(myTeams(db, personId)).toEqual([{ slug: 'zz-team', name: 'Team zz-team', role: 'observer' }]);
    db.insert(membership).values({ teamId: b.id, personId, role: 'lead', createdAt: 1 }).run();
    expect(myTeams(db, personId).map(({ slug }) => slug)).toEqual(['aa-team', 'zz-team']);
  });
});
