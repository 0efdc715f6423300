import type { Role } from '$lib/model/team/roles';
import type { Browser, Page } from 'playwright-core';
import { complaintsOf } from './complaints';
import { seedPerson, seedTeam, type SeededPerson } from './seed-people';
import { signIn } from './sign-in';
import type { RunningServer } from './start-server';

/** Somebody signed in, on a page of a browser context of their own. */
export interface Visitor {
  person: SeededPerson;
  page: Page;
  complaints: string[];
}

/** A person of a role in a team, signed in; `options` go to the browser's context. */
export async function visitor(
  browser: Browser,
  server: RunningServer,
  person: SeededPerson,
  options: Parameters<Browser['newContext']>[0] = {}
): Promise<Visitor> {
  const context = await browser.newContext({ reducedMotion: 'reduce', ...options });
  const page = await context.newPage();
  const complaints = complaintsOf(page);
  await signIn(page, server.address, person.email, person.password);
  return { person, page, complaints };
}

/** A team with one person of each of these roles. */
export async function teamOf(
  server: RunningServer,
  slug: string,
  roles: Role[]
): Promise<{ people: SeededPerson[]; root: string }> {
  const people: SeededPerson[] = [];
  for (const role of roles) people.push(await seedPerson(server, { name: `Invented ${role}` }));
  await seedTeam(
    server,
    slug,
    people.map((person, i) => [person, roles[i]])
  );
  return { people, root: `${server.address}/team/${slug}` };
}
