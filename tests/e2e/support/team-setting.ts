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

/**
 * What is left of a page's complaints without its own refusals of a status (which the browser writes to the console),
 * and without data requests of navigations: Chromium tells those as given up although the page got all it needed.
 */
export function complaintsBut(complaints: string[], status?: number): string[] {
  return complaints.filter(
    (line) =>
      !/__data\.json\S* net::ERR_ABORTED/.test(line) &&
      !(status && line.includes(`responded with a status of ${status}`))
  );
}
