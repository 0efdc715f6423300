import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, expect, it } from 'vitest';
import { until } from '../support/jobs';
import { openBrowser } from './support/open-browser';
import { askForJobs, jobsOf, seedDice } from './support/seed-datasets';
import { seedPerson, seedTeam } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

const JOBS = 10;
/** About a second a job, so that a server has some running and some waiting whenever it is killed. */
const RESAMPLES = 10_000;

const servers: RunningServer[] = [];
const folders: string[] = [];

afterEach(async () => {
  await Promise.all(servers.splice(0).map((server) => server.kill()));
  for (const folder of folders.splice(0)) rmSync(folder, { recursive: true, force: true });
});

async function start(folder: string): Promise<RunningServer> {
  const server = await startServer({ SEVERALTY_DATA: folder });
  servers.push(server);
  return server;
}

/** A server with ten jobs in its queue, and as many more on its data folder as asked for, which were there before. */
async function tenJobs(more = 0) {
  const folder = mkdtempSync(join(tmpdir(), 'severalty-jobs-'));
  folders.push(folder);
  const server = await start(folder);
  for (let i = 0; i < more; i++) await start(folder);
  const person = await seedPerson(server);
  const team = await seedTeam(server, 'killed', [[person, 'experimenter']]);
  const datasets = await seedDice(
    server,
    team.id,
    Array.from({ length: JOBS }, (_, i) => `dice ${i}`)
  );
  const browser = await openBrowser();
  const page = await browser.newPage();
  await signIn(page, server.address, person.email, person.password);
  await askForJobs(page, server.address, team.slug, { dataset: datasets, resamples: RESAMPLES });
  await browser.close();
  const look = () => jobsOf(server, team.id);
  return { folder, server, look };
}

type Looked = Awaited<ReturnType<typeof jobsOf>>;
const number = ({ jobs }: Looked, status: string) => jobs.filter((row) => row.status === status).length;

/** Every job is done, with one report of its own, and the database is sound. */
function expectAllDoneOnce({ jobs, reports, integrity, broken }: Looked): void {
  expect(jobs.map(({ status }) => status)).toEqual(Array(JOBS).fill('done'));
  expect(new Set(jobs.map(({ reportId }) => reportId)).size).toBe(JOBS);
  expect(reports).toHaveLength(JOBS);
  expect(reports.map(({ number }) => number)).toEqual(Array(JOBS).fill(1));
  expect([integrity, broken]).toEqual(['ok', []]);
}

it('a server killed twice during ten jobs ends every one of them once', async () => {
  const { folder, server, look } = await tenJobs();
  await until(look, (all) => number(all, 'running') > 0 && number(all, 'done') > 1);
  await server.kill();
  const first = await look();
  expect([first.integrity, first.broken]).toEqual(['ok', []]);
  expect(first.reports).toHaveLength(number(first, 'done'));
  const left = number(first, 'running');
  expect(left).toBeGreaterThan(0);

  const second = await start(folder);
  await until(look, (all) => number(all, 'running') > 0 && number(all, 'done') > number(first, 'done'));
  await second.kill();
  await start(folder);
  const last = await until(look, (all) => number(all, 'done') === JOBS, 60_000);
  expectAllDoneOnce(last);
  // Begun again, and no more often than it was killed.
  const attempts = last.jobs.map((row) => row.attempts);
  expect(Math.max(...attempts)).toBeLessThanOrEqual(3);
  expect(attempts.reduce((sum, times) => sum + times, 0)).toBeGreaterThan(JOBS);
}, 120_000);

it('two servers on one data folder share ten jobs, and run none twice', async () => {
  const { look } = await tenJobs(1);
  const last = await until(look, (all) => number(all, 'done') === JOBS, 60_000);
  expectAllDoneOnce(last);
  expect(last.jobs.map(({ attempts }) => attempts)).toEqual(Array(JOBS).fill(1));
  expect(new Set(last.jobs.map(({ runner }) => runner)).size).toBe(2);
}, 120_000);
