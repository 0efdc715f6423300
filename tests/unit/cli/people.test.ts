import { membership, person } from '$lib/server/db/schema';
import { checkPassword } from '$lib/server/services/accounts/check-password';
import { describe, expect, it } from 'vitest';
import { runPeople } from '../../../src/cli/people/run';
import { freshDatabase } from '../../support/fresh-database';
import { makeTeam } from '../../support/people';

const words = (line: string) => line.match(/"[^"]*"|\S+/g)!.map((word) => word.replaceAll('"', ''));

describe('npm run people', () => {
  it('adds somebody to a team with a password that is shown once and works', async () => {
    const db = freshDatabase();
    makeTeam(db, 'bay-side');
    const run = (line: string) => runPeople(db, words(line));
    expect(await run('list')).toEqual({ code: 0, text: 'Nobody has an account yet.' });
    const added = await run('add Ada@Example.org --name "Ada Invented" --team bay-side --role lead');
    expect(added.code).toBe(0);
    const password = added.text.split('\n').at(-1)!;
    expect(password).toMatch(/^[\w-]{20}$/);
    expect((await checkPassword(db, { email: 'ada@example.org', password }, 'cli')).ok).toBe(true);
    expect((await run('list')).text).toMatch(/ada@example\.org +Ada Invented +password +bay-side \(lead\)/);

    expect((await run('disable ada@example.org')).text).toMatch(/is closed, and signed out everywhere/);
    expect((await run('list')).text).toMatch(/closed/);
    expect((await run('disable ada@example.org')).text).toMatch(/already closed/);
    expect((await run('enable ada@example.org')).text).toBe('The account of ada@example.org is open.');
  });

  it('keeps the account of somebody who has one, and puts them into another team', async () => {
    const db = freshDatabase();
    for (const slug of ['one-team', 'two-team']) makeTeam(db, slug);
    const run = (line: string) => runPeople(db, words(line));
    await run('add a@e.org --name A --team one-team --role observer');
    const before = db.select().from(person).all();
    const again = await run('add a@e.org --name B --team two-team --role lead');
    expect(again).toEqual({
      code: 0,
      text: 'a@e.org has an account and keeps its name and password, lead of /team/two-team.'
    });
    expect(db.select().from(person).all()).toEqual(before);
    expect(db.select().from(membership).all().length).toBe(2);
    expect((await run('add a@e.org --name A --team two-team --role observer')).code).toBe(1);
    expect(
      db
        .select()
        .from(membership)
        .all()
        .map(({ role }) => role)
        .sort()
    ).toEqual(['lead', 'observer']);
  });

  it.each([
    ['', 2, /Say what to do/],
    ['remove a@e.org', 2, /Say what to do/],
    ['add', 2, /Type your address/],
    ['add a@e.org', 2, /--name/],
    ['add nonsense --name A', 2, /not an address/],
    ['add a@e.org --name A --team bay', 2, /together/],
    ['add a@e.org --name A --team bay --role king', 2, /no role "king"/],
    ['add a@e.org --name A --team bay --role lead', 1, /no team \/team\/bay/],
    ['disable a@e.org', 1, /Nobody has the address/],
    ['list --all', 2, /--all/]
  ])('%s: exit code %i', async (line, code, text) => {
    const db = freshDatabase();
    const outcome = await runPeople(db, line ? words(line) : []);
    expect(outcome.code).toBe(code);
    expect(outcome.text).toMatch(text);
    expect(db.select().from(person).all()).toEqual([]);
  });
});
