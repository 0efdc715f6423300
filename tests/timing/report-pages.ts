import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Browser } from 'playwright-core';
import { loadavg } from 'node:os';
import { interactiveTime, type InteractiveTime } from '../e2e/support/interactive-time';
import { openBrowser } from '../e2e/support/open-browser';
import { seedLink, seedSharedReport, type SharedReport } from '../e2e/support/shared-report';
import { signIn } from '../e2e/support/sign-in';
import { startServer, type RunningServer } from '../e2e/support/start-server';

// Measures and prints; it holds no time, since a busy machine would fail it. `npm run bench:pages`.
let server: RunningServer;
let browser: Browser;
let there: SharedReport;
let link: string;

beforeAll(async () => {
  [server, browser] = await Promise.all([startServer(), openBrowser()]);
  there = await seedSharedReport(server);
  link = (await seedLink(server, there)).path;
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const RUNS = 7;
const SLOWER = 4;

const median = (values: number[]): number => [...values].sort((a, b) => a - b)[values.length >> 1];

describe('interactive time', () => {
  it.each([
    ['team', 1280],
    ['link', 1280],
    ['link', 1920],
    ['link', 390]
  ] as const)('of the report page of the %s, %i wide', async (who, width) => {
    const runs: InteractiveTime[] = [];
    // The first opening has a server that never drew this page.
    for (let i = 0; i <= RUNS; i++) {
      const context = await browser.newContext({ viewport: { width, height: 900 } });
      if (who === 'team') {
        const page = await context.newPage();
        await signIn(page, server.address, there.lead.email, there.lead.password);
        await page.close();
      }
      const path = who === 'team' ? `/team/${there.team.slug}/reports/${there.reportId}` : link;
      const run = await interactiveTime(context, server.address + path, SLOWER);
      if (i > 0) runs.push(run);
      await context.close();
    }
    const told = (what: keyof InteractiveTime): string => {
      const values = runs.map((run) => run[what]);
      return `${median(values).toFixed(0)} ms (${Math.min(...values).toFixed(0)} to ${Math.max(...values).toFixed(0)})`;
    };
    console.log(
      [
        `Report page of the ${who}, ${width} wide, processor slowed ${SLOWER} times, median of ${RUNS} (least to most):`,
        `  a chart answers a key  ${told('answers')}`,
        `  nothing long to do     ${told('quiet')}`,
        `  things moved by        ${Math.max(...runs.map(({ shift }) => shift)).toFixed(4)} at most`,
        `  first screen drawn     ${told('drawn')}`,
        `  blocked until then     ${told('blocking')}`,
        `  load of this machine   ${loadavg()[0].toFixed(1)}`
      ].join('\n')
    );
    expect(runs).toHaveLength(RUNS);
    expect(runs.every(({ answers }) => answers > 0)).toBe(true);
  });
});
