import { watch } from '$lib/server/db/schema';
import { myWatches } from '$lib/server/services/watches/my-watches';
import { saveWatch } from '$lib/server/services/watches/save-watch';
import { stopWatching, watchedTeams } from '$lib/server/services/watches/stop-watching';
import { readUnsubscribe, unsubscribeToken } from '$lib/server/services/watches/unsubscribe-token';
import { expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const secret = 'an invented key of the server, long enough';

it('a link that ends mail is of one person and team, or all teams, and cannot be made up or changed', () => {
  const [personId, teamId, other] = ['a', 'b', 'c'].map((letter) => letter.repeat(26));
  for (const whose of [
    { personId, teamId },
    { personId, teamId: null }
  ]) {
    const token = unsubscribeToken(whose, secret);
    expect(readUnsubscribe(token, secret)).toEqual(whose);
    expect(readUnsubscribe(token, `${secret}!`)).toBeNull();
    expect(readUnsubscribe(token.replace(personId, other), secret)).toBeNull();
    expect(readUnsubscribe(token.slice(0, -1), secret)).toBeNull();
    expect(readUnsubscribe(`${token.slice(0, -3)}AAA`, secret)).toBeNull();
  }
  const one = unsubscribeToken({ personId, teamId }, secret);
  expect(readUnsubscribe(one.replace(teamId, ''), secret)).toBeNull();
  expect(readUnsubscribe('', secret)).toBeNull();
});

it('ends the mail of that team, of that person alone', () => {
  const db = freshDatabase();
  const { id: teamId } = makeTeam(db, 'bay-side');
  const [ada, ben] = [makeMember(db, teamId, 'lead'), makeMember(db, teamId, 'observer')];
  for (const { personId } of [ada, ben])
    saveWatch(db, personId, 'bay-side', { about: ['remark'], rhythm: 'daily' });
  const whose = { personId: ada.personId, teamId };
  expect(watchedTeams(db, whose)).toEqual(['Team bay-side']);
  stopWatching(db, whose);
  stopWatching(db, whose);
  expect(watchedTeams(db, whose)).toEqual([]);
  expect(db.select().from(watch).all()).toMatchObject([{ personId: ben.personId }]);
  expect(myWatches(db, ada.personId)).toEqual([
    { slug: 'bay-side', team: 'Team bay-side', about: [], rhythm: 'at-once' }
  ]);
});
