import { chromium, type Browser } from 'playwright-core';
import { inject } from 'vitest';

/**
 * A real browser for one test file; close it in afterAll. The flags are the few it needs in a container.
 * The package's own list is not used: it switches web security off and runs everything in one process.
 */
export function openBrowser(): Promise<Browser> {
  const { path, env } = inject('browser');
  return chromium.launch({
    executablePath: path,
    headless: true,
    args: ['--no-sandbox', '--disable-gpu', '--disable-quic', '--disable-background-networking'],
    env: { ...(process.env as Record<string, string>), ...env }
  });
}
