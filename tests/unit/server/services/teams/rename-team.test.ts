import { eq } from 'drizzle-orm';
import { event, team } from '$lib/server/db/schema';
import { renameTeam } from '$lib/server/services/teams/rename-team';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

describe('renameTeam', () => {
  it('changes the name and not the address, for a lead of the team alone', () => {
    const db = freshDatabase();
    const [ours, theirs] = [makeTeam(db, 'ours'), makeTeam(db, 'theirs')];
    const lead = makeMember(db, ours.id, 'lead');
    const refused = [
      makeMember(db, ours.id, 'experimenter'),
      { ...makeMember(db, theirs.id, 'lead'), teamId: ours.id }
    ];
    for (const actor of refused)
      expect(renameTeam(db, actor, 'Mine')).toEqual({ ok: false, reason: 'not-allowed' });
    expect(renameTeam(db, lead, '  Quay chain  ', 3)).toEqual({ ok: true });
    expect(renameTeam(db, lead, 'Quay chain', 4)).toEqual({ ok: true });
    expect(db.select().from(team).where(eq(team.id, ours.id)).get()).toMatchObject({
      slug: 'ours',
      name: 'Quay chain'
    });
    expect(db.select().from(event).all()).toMatchObject([
      { at: 3, action: 'team.rename', detail: '{"from":"Team ours","to":"Quay chain"}' }
    ]);
  });

  it.each(['', '   ', 'x'.repeat(81), 'two\nlines', 'a\u2028b'])('refuses the name %j', (name) => {
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    expect(renameTeam(db, lead, name)).toEqual({ ok: false, reason: 'bad-name' });
  });
});
