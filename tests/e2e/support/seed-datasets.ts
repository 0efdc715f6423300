import { job, report } from '$lib/server/db/schema';
import { eq } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { makeDataset } from '../../support/saved-reports';
import { seedPerson, seedTeam, withDatabaseOf } from './seed-people';
import { signIn } from './sign-in';
import type { RunningServer } from './start-server';

/** Weldon's dice, 26 306 throws of 12, as fixtures/weldon-dice.csv has them, with its source there. */
export const DICE: [number, number][] = [
  [0, 185],
  [1, 1149],
  [2, 3265],
  [3, 5475],
  [4, 6114],
  [5, 5194],
  [6, 3067],
  [7, 1331],
  [8, 403],
  [9, 105],
  [10, 14],
  [11, 4]
];

/**
 * The dice with 60 throws more in which every die showed it (invented): no resample is so extreme, so that none of the
 * tests ends early and the time goes with the number of resamples.
 */
export const LOADED: [number, number][] = [...DICE, [12, 60]];

/** So many resamples that the loaded dice never end while a test runs: those jobs are cancelled. */
export const ENDLESS = 1_000_000;

/** Datasets of the dice in a team of a running server. */
export function seedDice(
  server: Pick<RunningServer, 'data'>,
  teamId: string,
  names: string[],
  trials = 12,
  rows = DICE,
  more: Parameters<typeof makeDataset>[3] = {}
): Promise<string[]> {
  const counts = JSON.stringify({ kind: 'histogram', counts: rows, lump: null });
  return withDatabaseOf(server, (db) =>
    names.map((name) =>
      makeDataset(db, teamId, null, { name, counts, trials, shots: 26_306, largest: 11, ...more })
    )
  );
}

/** Asks for diagnoses as a script does; gives the ids of the jobs. */
export async function askForJobs(
  page: Page,
  address: string,
  slug: string,
  request: { dataset: string[]; resamples?: number; seed?: number }
): Promise<string[]> {
  const response = await page.request.post(`${address}/team/${slug}/jobs`, {
    data: request,
    headers: { origin: address }
  });
  if (response.status() !== 202) throw new Error(`${response.status()}: ${await response.text()}`);
  return ((await response.json()) as { jobs: { id: string }[] }).jobs.map(({ id }) => id);
}

/** The jobs of a team and their reports, as the database of a server has them. */
export function jobsOf(server: Pick<RunningServer, 'data'>, teamId: string) {
  return withDatabaseOf(server, (db) => ({
    jobs: db.select().from(job).where(eq(job.teamId, teamId)).all(),
    reports: db.select().from(report).where(eq(report.teamId, teamId)).all(),
    integrity: db.$client.pragma('integrity_check', { simple: true }),
    broken: db.$client.pragma('foreign_key_check')
  }));
}

let number = 0;

/** A team of its own with an experimenter, signed in on a page. */
export async function jobsTeam(
  server: RunningServer,
  browser: Browser,
  options: Parameters<Browser['newContext']>[0] = {}
) {
  const slug = `jobs-${++number}`;
  const person = await seedPerson(server);
  const team = await seedTeam(server, slug, [[person, 'experimenter']]);
  const page = await (await browser.newContext(options)).newPage();
  await signIn(page, server.address, person.email, person.password);
  return { slug, team, person, page, jobs: `${server.address}/team/${slug}/jobs` };
}
