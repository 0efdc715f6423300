import { eq } from 'drizzle-orm';
import { person } from '$lib/server/db/schema';
import { askTeam } from '$lib/server/services/access/ask-team';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makePerson, makeTeam } from '../../../../support/people';

describe('askTeam', () => {
  it('gives a member the team and an actor, and refuses what the role does not allow', () => {
    const db = freshDatabase();
    const team = makeTeam(db);
    const observer = makeMember(db, team.id, 'observer');
    expect(askTeam(db, observer.personId, team.slug, 'see')).toEqual({ ok: true, team, actor: observer });
    expect(askTeam(db, observer.personId, team.slug, 'upload')).toEqual({ ok: false, reason: 'not-allowed' });
  });

  it('says the same of a foreign team as of one that does not exist', () => {
    const db = freshDatabase();
    const team = makeTeam(db);
    makeMember(db, team.id, 'lead');
    const stranger = makePerson(db);
    expect(askTeam(db, stranger.id, team.slug, 'see')).toEqual({ ok: false, reason: 'unknown' });
    expect(askTeam(db, stranger.id, 'no-such-team', 'see')).toEqual({ ok: false, reason: 'unknown' });
    expect(askTeam(db, null, team.slug, 'see')).toEqual({ ok: false, reason: 'signed-out' });
  });

  it('knows nobody who is disabled', () => {
    const db = freshDatabase();
    const team = makeTeam(db);
    const lead = makeMember(db, team.id, 'lead');
    db.update(person).set({ disabledAt: 5 }).where(eq(person.id, lead.personId)).run();
    expect(askTeam(db, lead.personId, team.slug, 'see')).toEqual({ ok: false, reason: 'unknown' });
  });
});
