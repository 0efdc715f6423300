import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

export interface RunningServer {
  /** http://localhost:PORT, without a closing slash. */
  address: string;
  /** Its data folder, for tests that put people and teams into the database. */
  data: string;
  /** What it has written so far, both outputs together. */
  output(): string;
  /** Ends it as a person would (SIGTERM) and removes its data. Gives the exit code. */
  stop(): Promise<number | null>;
  /** Ends it as a failure of power would (SIGKILL), and leaves its data. */
  kill(): Promise<void>;
}

/** Longest a start may take: migrating and loading take under a second, a busy machine ten times that. */
const PATIENCE = 30_000;

/**
 * Starts what `npm start` starts, on a free port with a data folder of its own.
 *
 * @param command the program and its arguments; the built start command unless a test is about another way in
 */
export async function startServer(
  env: Record<string, string> = {},
  [program, ...args]: string[] = [process.execPath, 'build-cli/start.js']
): Promise<RunningServer> {
  const data = mkdtempSync(join(tmpdir(), 'severalty-'));
  const own = {
    ...process.env,
    PORT: '0',
    SEVERALTY_DATA: data,
    NODE_ENV: 'production',
    SEVERALTY_DEMO: 'no',
    ...env
  };
  // Settings of the developer's own shell must not reach the tests.
  for (const name of [
    'ORIGIN',
    'HOST',
    'AUTH_SECRET',
    'SMTP_URL',
    'OIDC_ISSUER',
    'ADDRESS_HEADER',
    'npm_lifecycle_event'
  ])
    if (!(name in env)) delete (own as Record<string, unknown>)[name];
  const child = spawn(program, args, {
    env: own,
    stdio: ['ignore', 'pipe', 'pipe']
  });
  let output = '';
  const ended = new Promise<number | null>((resolve) => child.once('close', (code) => resolve(code)));
  const address = await new Promise<string>((resolve, reject) => {
    const late = setTimeout(
      () => reject(new Error(`The server did not start in time.\n${output}`)),
      PATIENCE
    );
    const listen = (chunk: Buffer) => {
      output += chunk;
      const found = /ready at (\S+)/.exec(output);
      if (found) {
        clearTimeout(late);
        resolve(found[1]);
      }
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    void ended.then((code) => reject(new Error(`The server ended with code ${code}.\n${output}`)));
  }).catch((error: unknown) => {
    child.kill('SIGKILL');
    rmSync(data, { recursive: true, force: true });
    throw error;
  });
  return {
    address,
    data: own.SEVERALTY_DATA,
    output: () => output,
    async stop() {
      child.kill('SIGTERM');
      const code = await ended;
      rmSync(data, { recursive: true, force: true });
      return code;
    },
    async kill() {
      child.kill('SIGKILL');
      await ended;
      // Where the test keeps the data, the folder made here was never used.
      if (own.SEVERALTY_DATA !== data) rmSync(data, { recursive: true, force: true });
    }
  };
}
