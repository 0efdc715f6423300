import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from './support/open-browser';
import { pageOf as open, real, reportsSetting, type ReportsSetting } from './support/reports-setting';
import type { SeededPerson } from './support/seed-people';
import { startServer, type RunningServer } from './support/start-server';

let server: RunningServer;
let browser: Browser;
let { lead, observer, root, reports } = {} as ReportsSetting;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  ({ lead, observer, root, reports } = await reportsSetting(server));
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const pageOf = (person: SeededPerson, options: Parameters<Browser['newContext']>[0] = {}) =>
  open(browser, server, person, options);

const law = (page: Page) => page.locator('#remarks-law');

describe('remarks', () => {
  it('are made, answered and settled in place', async () => {
    const observers = await pageOf(observer);
    await observers.page.goto(`${root}/${reports[0]}`, { waitUntil: 'networkidle' });
    await law(observers.page).locator('summary').first().click();
    await observers.page
      .getByLabel('A new remark')
      .locator('visible=true')
      .fill('Why so few trials?\n<b>Say</b> why.');
    await observers.page.getByRole('button', { name: 'Make this remark' }).locator('visible=true').click();
    const begun = law(observers.page).getByRole('article');
    await begun.waitFor();
    expect(await begun.locator('.body').textContent()).toBe('Why so few trials?\n<b>Say</b> why.');
    expect(await law(observers.page).locator('summary').first().textContent()).toBe(
      '1 remark on the best law, 1 thread open'
    );
    expect(real(observers.complaints)).toEqual([]);

    const leads = await pageOf(lead);
    await leads.page.goto(`${root}/${reports[0]}#remarks-law`, { waitUntil: 'networkidle' });
    const thread = law(leads.page).getByRole('article');
    await thread.getByText('Answer', { exact: true }).first().click();
    await thread.getByRole('textbox').fill('The trap holds three.');
    await thread.getByRole('button', { name: 'Send this answer' }).click();
    await expect.poll(() => thread.locator('li').count()).toBe(2);
    await thread.getByRole('button', { name: 'Settle this thread' }).click();
    await thread.getByText(/^Settled by Lena Lead/).waitFor();
    expect(real(leads.complaints)).toEqual([]);

    await observers.page.reload({ waitUntil: 'networkidle' });
    expect(await law(observers.page).locator('summary').first().textContent()).toBe(
      '2 remarks on the best law, settled'
    );
    await leads.page.goto(`${server.address}/outbox`);
    const outbox = (await leads.page.textContent('main')) ?? '';
    expect(outbox).toContain('New remark on report 1 of Slow quench');
    await observers.context.close();
    await leads.context.close();
  });

  it('work as plain forms without JavaScript, and give back what was refused', async () => {
    const { page, context } = await pageOf(observer, { javaScriptEnabled: false });
    await page.goto(`${root}/${reports[1]}`);
    const tails = page.locator('#remarks-tails');
    await tails.locator('summary').first().click();
    await tails.getByLabel('A new remark').fill('The high tail rests on two shots.');
    await tails.getByRole('button', { name: 'Make this remark' }).click();
    expect(await tails.getAttribute('open')).not.toBeNull();
    const thread = tails.getByRole('article');
    expect(await thread.locator('.body').textContent()).toBe('The high tail rests on two shots.');
    await thread.getByRole('button', { name: 'Settle this thread' }).click();
    expect(await tails.locator('summary').first().textContent()).toBe('1 remark on the tails, settled');
    await tails.getByLabel('A new remark').evaluate((field: HTMLTextAreaElement) => (field.required = false));
    await tails.getByLabel('A new remark').fill('   ');
    await tails.getByRole('button', { name: 'Make this remark' }).click();
    expect(await tails.getByRole('alert').textContent()).toBe('Write the remark first.');
    await context.close();
  });

  it('keep what was typed when the server is out of reach', async () => {
    const { page, context } = await pageOf(observer);
    await page.goto(`${root}/${reports[1]}`, { waitUntil: 'networkidle' });
    const rate = page.locator('#remarks-rate');
    await rate.locator('summary').first().click();
    await rate.getByLabel('A new remark').fill('Typed with care.');
    await context.setOffline(true);
    await rate.getByRole('button', { name: 'Make this remark' }).click();
    await rate.getByRole('alert').waitFor();
    expect(await rate.getByLabel('A new remark').inputValue()).toBe('Typed with care.');
    await context.close();
  });

  it('are refused as problem details by the JSON route', async () => {
    const { page, context } = await pageOf(observer);
    const address = `${root}/${reports[1]}/remarks`;
    const answer = async (data: unknown) => {
      const response = await page.request.post(address, { data });
      return [response.status(), ((await response.json()) as { code: string }).code];
    };
    expect(await answer({ section: 'nowhere', body: 'x' })).toEqual([400, 'bad-input']);
    expect(await answer({ section: 'law', body: '' })).toEqual([400, 'bad-input']);
    expect(await answer({ section: 'law', body: 'x'.repeat(5000) })).toEqual([400, 'bad-input']);
    expect(await answer({ section: 'law', threadId: 'none', body: 'x' })).toEqual([404, 'not-found']);
    const text = await page.request.post(address, { data: 'x', headers: { 'content-type': 'text/csv' } });
    expect(text.status()).toBe(415);
    await context.close();
  });
});
