import { eq } from 'drizzle-orm';
import { membership, person } from '$lib/server/db/schema';
import { members } from '$lib/server/services/teams/members';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

describe('members', () => {
  it('lists a team to its leads: leads first, then by name, without regard to capitals', () => {
    const db = freshDatabase();
    const [ours, theirs] = [makeTeam(db), makeTeam(db)];
    const observer = makeMember(db, ours.id, 'observer');
    const lead = makeMember(db, ours.id, 'lead');
    const [zoe, abe] = [makeMember(db, ours.id, 'experimenter'), makeMember(db, ours.id, 'experimenter')];
    makeMember(db, theirs.id, 'lead');
    db.update(person).set({ name: 'Zoe' }).where(eq(person.id, zoe.personId)).run();
    db.update(person).set({ name: 'abe', disabledAt: 4 }).where(eq(person.id, abe.personId)).run();
    db.update(membership).set({ createdAt: 77 }).where(eq(membership.personId, zoe.personId)).run();

    const list = members(db, lead);
    expect(list.map(({ personId }) => personId)).toEqual([
      lead.personId,
      abe.personId,
      zoe.personId,
      observer.personId
    ]);
    expect(list[2]).toEqual({
      personId: zoe.personId,
      name: 'Zoe',
      email: `${zoe.personId}@example.org`,
      role: 'experimenter',
      since: 77,
      disabled: false
    });
    expect(list[1].disabled).toBe(true);
  });

  it('lists nobody to an experimenter, an observer, a lead of another team, or a lead who was lowered', () => {
    const db = freshDatabase();
    const [ours, theirs] = [makeTeam(db), makeTeam(db)];
    const lead = makeMember(db, ours.id, 'lead');
    expect(members(db, makeMember(db, ours.id, 'experimenter'))).toEqual([]);
    expect(members(db, makeMember(db, ours.id, 'observer'))).toEqual([]);
    expect(members(db, { ...makeMember(db, theirs.id, 'lead'), teamId: ours.id })).toEqual([]);
    db.update(membership).set({ role: 'observer' }).where(eq(membership.personId, lead.personId)).run();
    expect(members(db, lead)).toEqual([]);
  });
});
