import type { Page } from 'playwright-core';

/**
 * Collects what a page complains about from now on: console errors and warnings (a breach of the content
 * security policy is one), uncaught exceptions, requests that failed or that left this machine.
 *
 * @param page before its first navigation
 * @returns the list, which grows; empty means that nothing was wrong so far
 */
export function complaintsOf(page: Page): string[] {
  const list: string[] = [];
  page.on('console', (message) => {
    if (['error', 'warning'].includes(message.type())) list.push(`${message.type()}: ${message.text()}`);
  });
  page.on('pageerror', (error) => list.push(`uncaught: ${error.message}`));
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText ?? '';
    // Kit gives up its own load of a page's data when the next step overtakes it, and a page that is left ends its
    // stream of events: nothing failed then.
    if (why === 'net::ERR_ABORTED' && /\/(__data\.json|jobs\/stream)$/.test(new URL(request.url()).pathname))
      return;
    list.push(`failed: ${request.url()} ${why}`);
  });
  page.on('request', (request) => {
    const url = new URL(request.url());
    if (/^https?:$/.test(url.protocol) && url.hostname !== 'localhost')
      list.push(`left the machine: ${url.href}`);
  });
  return list;
}
