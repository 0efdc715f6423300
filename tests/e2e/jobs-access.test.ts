import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { askForJobs, ENDLESS, jobsTeam, LOADED, seedDice } from './support/seed-datasets';
import { seedPerson, withDatabaseOf } from './support/seed-people';
import { signIn } from './support/sign-in';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const setting = () => jobsTeam(server, browser);

describe('who may start and see jobs', () => {
  it('an observer sees the jobs and starts none, on the page and by script', async () => {
    const { slug, team, page, jobs } = await setting();
    const [datasetId] = await seedDice(server, team.id, ['Dice to watch'], 12, LOADED);
    const [id] = await askForJobs(page, server.address, slug, { dataset: [datasetId], resamples: ENDLESS });
    const observer = await seedPerson(server);
    await seedTeamMember(team.id, observer.id);
    const watching = await (await browser.newContext()).newPage();
    await signIn(watching, server.address, observer.email, observer.password);
    await watching.goto(jobs);
    await watching.getByRole('progressbar').waitFor();
    expect(await watching.getByRole('button', { name: /Cancel/ }).count()).toBe(0);
    const headers = { origin: server.address };
    const post = (path: string, accept: string) =>
      watching.request.post(path, {
        form: { dataset: datasetId },
        headers: { ...headers, accept },
        maxRedirects: 0
      });
    for (const accept of ['text/html', 'application/json'])
      for (const path of [jobs, `${jobs}/${id}/cancel`, `${jobs}/${id}/retry`])
        expect((await post(path, accept)).status(), `${accept} ${path}`).toBe(403);
    await page.request.post(`${jobs}/${id}/cancel`, { data: {}, headers });
    await page.context().close();
    await watching.context().close();
  });

  it('ids of another team are unknown everywhere', async () => {
    const mine = await setting();
    const theirs = await setting();
    const [datasetId] = await seedDice(server, theirs.team.id, ['Their dice'], 12, LOADED);
    const [id] = await askForJobs(theirs.page, server.address, theirs.slug, {
      dataset: [datasetId],
      resamples: ENDLESS
    });
    const post = async (path: string, accept: string) => {
      const response = await mine.page.request.post(path, {
        form: { dataset: datasetId },
        headers: { origin: server.address, accept },
        maxRedirects: 0
      });
      return response.status();
    };
    for (const accept of ['text/html', 'application/json'])
      for (const path of [
        mine.jobs,
        `${mine.jobs}/${id}/cancel`,
        `${mine.jobs}/${id}/retry`,
        theirs.jobs,
        `${theirs.jobs}/${id}/cancel`
      ])
        expect(await post(path, accept), `${accept} ${path}`).toBe(404);
    for (const path of ['', '/stream', `/statuses?dataset=${datasetId}`])
      for (const accept of ['text/html', 'application/json'])
        expect(
          (await mine.page.request.get(theirs.jobs + path, { headers: { accept } })).status(),
          `${accept} ${path}`
        ).toBe(404);
    const statuses = await mine.page.request.get(`${mine.jobs}/statuses?dataset=${datasetId}`);
    expect(await statuses.json()).toEqual({});
    await theirs.page.request.post(`${theirs.jobs}/${id}/cancel`, {
      data: {},
      headers: { origin: server.address }
    });
    for (const { page } of [mine, theirs]) await page.context().close();
  });
});

async function seedTeamMember(teamId: string, personId: string): Promise<void> {
  await withDatabaseOf(server, (db) =>
    db.$client
      .prepare(`insert into membership (team_id, person_id, role, created_at) values (?, ?, 'observer', 1)`)
      .run(teamId, personId)
  );
}
