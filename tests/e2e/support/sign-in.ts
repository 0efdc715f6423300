import type { Page } from 'playwright-core';

/**
 * Signs a page's browser in by one POST to the form; the page itself stays where it is.
 *
 * @param address of the server, as RunningServer gives it
 */
export async function signIn(page: Page, address: string, email: string, password: string): Promise<void> {
  const response = await page.request.post(`${address}/sign-in`, {
    form: { email, password },
    headers: { origin: address, accept: 'text/html' },
    maxRedirects: 0
  });
  if (response.status() !== 303)
    throw new Error(`Signing in as ${email} was answered with ${response.status()}.`);
}
