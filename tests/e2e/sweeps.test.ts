import { dataset } from '$lib/server/db/schema';
import { eq } from 'drizzle-orm';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { asked, free, makeQuench, saved, times } from '../support/sweeps';
import { openBrowser } from './support/open-browser';
import { withDatabaseOf } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';
import { complaintsBut, teamOf, visitor } from './support/team-setting';

let server: RunningServer;
let browser: Browser;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

/** Nine ramps over two decades in a team of their own, and a sweep of them. */
async function withQuench(slug: string) {
  const { people, root } = await teamOf(server, slug, ['experimenter']);
  const { ids, sweep } = await withDatabaseOf(server, (db) => {
    const team = db.query.team.findFirst({ where: (row, { eq: is }) => is(row.slug, slug) }).sync()!;
    const actor = { personId: people[0].id, teamId: team.id, role: 'experimenter' as const };
    const made = makeQuench(db, actor, free, 1);
    return { ids: made, sweep: saved(db, actor, asked(made)) };
  });
  return { ...(await visitor(browser, server, people[0])), ids, root, at: `${root}/sweeps/${sweep}` };
}

const windowOf = (page: Page) =>
  ['from', 'to'].map((end) => Number(new URL(page.url()).searchParams.get(end)));

describe('the window of a sweep', () => {
  it('is dragged on the chart, moved there by keys, moved by sliders, and saved as a sweep of its own', async () => {
    const { page, at, complaints } = await withQuench('drag');
    await page.goto(at, { waitUntil: 'networkidle' });
    const begin = page.getByRole('slider', { name: 'Window from', exact: true }).first();
    const end = page.getByRole('slider', { name: 'Window to', exact: true }).first();
    await begin.locator('rect').scrollIntoViewIfNeeded();
    const grip = (await begin.locator('rect').boundingBox())!;
    const far = (await end.locator('rect').boundingBox())!;
    // Two of the eight steps between both ends, and a little more: the line stands at a time.
    await page.mouse.move(grip.x + grip.width / 2, grip.y + grip.height / 2);
    await page.mouse.down();
    await page.mouse.move(grip.x + grip.width / 2 + (far.x - grip.x) * (2.2 / 8), grip.y + 200, { steps: 5 });
    await page.mouse.up();
    await page.getByText('Not saved:').waitFor();
    expect(windowOf(page)).toEqual([times[2], times[8]]);

    // The line itself is taken as well as its flag: here far below it, and dropped back at the first time.
    const held = (await begin.locator('.line').boundingBox())!;
    await page.mouse.move(held.x + held.width / 2, held.y + held.height * 0.7);
    await page.mouse.down();
    await page.mouse.move(grip.x + grip.width / 2, held.y + held.height * 0.7, { steps: 5 });
    await page.mouse.up();
    await page.waitForURL((url) => Number(url.searchParams.get('from')) === times[0]);
    await begin.focus();
    for (let i = 0; i < 2; i++) await page.keyboard.press('ArrowRight');
    await page.waitForURL((url) => Number(url.searchParams.get('from')) === times[2]);

    await end.focus();
    await page.keyboard.press('ArrowLeft');
    await page.waitForURL((url) => Number(url.searchParams.get('to')) === times[7]);
    expect(await end.getAttribute('aria-valuetext')).toBe('56.23 µs');
    // The window never closes: its end stops beside its beginning.
    await page.keyboard.press('Home');
    await page.waitForURL((url) => Number(url.searchParams.get('to')) === times[3]);

    await page.getByRole('form', { name: 'Window of the power laws' }).locator('input').nth(1).press('End');
    await page.waitForURL((url) => Number(url.searchParams.get('to')) === times[8]);
    await page.getByRole('button', { name: 'Save it as a sweep of its own' }).click();
    await page.waitForURL((url) => url.search === '' && !at.endsWith(url.pathname));
    expect(await begin.getAttribute('aria-valuenow')).toBe('2');

    const pdf = await page.request.get(`${page.url()}/sweep.pdf`);
    expect(pdf.headers()['content-type']).toBe('application/pdf');
    expect((await pdf.body()).subarray(0, 5).toString()).toBe('%PDF-');
    expect(complaintsBut(complaints)).toEqual([]);
  });
});

describe('an address that asks for a window that is none', () => {
  it.each(['from=16&to=2', 'from=abc&to=5', 'from=5', 'to=', 'from=0&to=5'])('%s', async (search) => {
    const { page, at } = await withQuench(`no-window-${search.replace(/[^a-z0-9]/g, '')}`);
    await page.goto(`${at}?${search}`);
    expect(await page.getByRole('alert').innerText()).toBe(
      'The window goes from a time above 0 to a later one. What is shown is the sweep as it was saved.'
    );
  });
});

describe('the form of a new sweep', () => {
  it('is filled in by keys alone', async () => {
    const { page, root, complaints } = await withQuench('by-keys');
    await page.goto(`${root}/sweeps/new`, { waitUntil: 'networkidle' });
    const reach = async (name: RegExp, role: 'textbox' | 'button') => {
      const wanted = page.getByRole(role, { name });
      for (let i = 0; i < 80; i++) {
        if (await wanted.evaluate((one) => one === document.activeElement)) return;
        await page.keyboard.press('Tab');
      }
      throw new Error(`${name} is not reached by Tab.`);
    };
    await reach(/^Name/, 'textbox');
    await page.keyboard.type('By keys alone');
    await reach(/Ising chain/, 'button');
    await page.keyboard.press('Enter');
    expect(await page.getByRole('textbox', { name: /^z\b/ }).inputValue()).toBe('1');
    await reach(/^Make this sweep/, 'button');
    await page.keyboard.press('Enter');
    await page.getByRole('heading', { level: 1, name: 'By keys alone' }).waitFor();
    expect(await page.locator('body').innerText()).toContain('gives dν/(1 + zν) = 0.5000');
    expect(complaintsBut(complaints)).toEqual([]);
  });

  it.each([
    [
      'a time of zero',
      { quenchTime: 0 },
      /has a time of 0: on a logarithmic axis a time is above 0\. Leave it out, or give the time\./
    ],
    ['mixed units', { quenchUnit: 'ħ/J' }, /Units are mixed/]
  ])('says in words what is wrong with %s, and loses nothing typed', async (name, more, words) => {
    const { page, ids, root } = await withQuench(name.replaceAll(' ', '-'));
    await withDatabaseOf(server, (db) => db.update(dataset).set(more).where(eq(dataset.id, ids[4])).run());
    await page.goto(`${root}/sweeps/new`, { waitUntil: 'networkidle' });
    await page.getByRole('textbox', { name: /^Name/ }).fill('kept as typed');
    // One without a time above 0 is offered, and not marked.
    const fifth = page.getByRole('checkbox', { name: 'Take quench 5' });
    expect(await fifth.isChecked()).toBe(!('quenchTime' in more));
    await fifth.check();
    await page.getByRole('button', { name: 'Make this sweep' }).click();
    const told = page.getByRole('alert');
    await told.waitFor();
    expect(await told.innerText()).toMatch(words);
    expect(await page.getByRole('textbox', { name: /^Name/ }).inputValue()).toBe('kept as typed');
  });

  it('says that one dataset is no sweep', async () => {
    const { page, root } = await withQuench('one-alone');
    await page.goto(`${root}/sweeps/new`, { waitUntil: 'networkidle' });
    for (const box of (await page.getByRole('checkbox', { name: /^Take quench/ }).all()).slice(1))
      await box.uncheck();
    await page.getByRole('button', { name: 'Make this sweep' }).click();
    await page.getByRole('alert').waitFor();
    expect(await page.getByRole('alert').innerText()).toBe(
      'Mark at least two datasets, taken with different times.'
    );
    expect(await page.getByRole('checkbox', { name: /^Take quench/, checked: true }).count()).toBe(1);
  });
});
