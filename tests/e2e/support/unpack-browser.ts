import { existsSync, mkdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import { join, resolve } from 'node:path';
import type { TestProject } from 'vitest/node';

export interface BrowserBinary {
  path: string;
  /** Added to the browser's environment: its own libraries and a font it can draw with. */
  env: Record<string, string>;
}

declare module 'vitest' {
  export interface ProvidedContext {
    browser: BrowserBinary;
  }
}

/** Runs once before the browser tests: two test files unpacking at once would spoil each other's browser. */
export default async function setup(project: TestProject): Promise<void> {
  project.provide('browser', await unpackBrowser());
}

/**
 * The browser that the tests drive: CHROMIUM=/path where that is set, else the one inside the npm package
 * @sparticuz/chromium, unpacked once (170 MB) into node_modules, where it goes when the packages go.
 */
async function unpackBrowser(): Promise<BrowserBinary> {
  if (process.env.CHROMIUM) return { path: process.env.CHROMIUM, env: {} };
  const version = versionOf('@sparticuz/chromium');
  const folder = resolve('node_modules', '.cache', `chromium-${version}`);
  if (!existsSync(folder)) {
    const part = `${folder}.${process.pid}`;
    mkdirSync(part, { recursive: true });
    await unpackInto(part);
    // Renamed when whole: a run that was interrupted, or a second one, never leaves half a browser.
    if (existsSync(folder)) rmSync(part, { recursive: true, force: true });
    else renameSync(part, folder);
  }
  const fonts = join(folder, 'fonts.conf');
  writeFileSync(
    fonts,
    `<?xml version="1.0"?>
<!DOCTYPE fontconfig SYSTEM "fonts.dtd">
<fontconfig>
  <dir>${join(folder, 'fonts')}</dir>
  <cachedir>${join(folder, 'font-cache')}</cachedir>
</fontconfig>
`
  );
  return {
    path: join(folder, 'chromium'),
    env: { FONTCONFIG_FILE: fonts, LD_LIBRARY_PATH: join(folder, 'al2023', 'lib') }
  };
}

/** The package unpacks into the temporary folder, and its libraries only where it believes to be in the cloud. */
async function unpackInto(folder: string): Promise<void> {
  const before = { ...process.env };
  process.env.TMPDIR = folder;
  process.env.AWS_LAMBDA_JS_RUNTIME = 'nodejs20.x';
  try {
    const { default: chromium } = await import('@sparticuz/chromium');
    await chromium.executablePath();
  } finally {
    // What the package added would reach every server that the tests start.
    for (const name of ['TMPDIR', 'AWS_LAMBDA_JS_RUNTIME', 'LD_LIBRARY_PATH', 'FONTCONFIG_PATH', 'HOME']) {
      if (before[name] === undefined) delete process.env[name];
      else process.env[name] = before[name];
    }
  }
}

function versionOf(name: string): string {
  return (JSON.parse(readFileSync(join('node_modules', name, 'package.json'), 'utf8')) as { version: string })
    .version;
}
