import axe, { type AxeResults } from 'axe-core';
import type { Browser, Page } from 'playwright-core';
import { unrolled } from './unrolled';

/**
 * A page that axe can be injected into: the content security policy would refuse a foreign script, so it is
 * bypassed here, and only here. The smoke test holds the policy itself.
 */
export async function openAuditPage(
  browser: Browser,
  options: Parameters<Browser['newContext']>[0] = {}
): Promise<Page> {
  const context = await browser.newContext({ ...options, bypassCSP: true });
  return context.newPage();
}

/** What breaks WCAG 2.2 A and AA on the page as it stands once it is laid out, one line each; empty when nothing does. */
export async function audit(page: Page): Promise<string[]> {
  await unrolled(page);
  await page.evaluate(axe.source);
  const results = await page.evaluate(async () => {
    const run = (window as unknown as { axe: typeof axe }).axe.run;
    return (await run(document, {
      runOnly: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice']
    })) as AxeResults;
  });
  return results.violations.flatMap((violation) =>
    violation.nodes.map((node) => `${violation.id}: ${violation.help} at ${node.target.join(' ')}`)
  );
}
