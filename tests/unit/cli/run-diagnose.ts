import { type ChildProcess, spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { resolve as absolute } from 'node:path';

const command = 'build-cli/diagnose.js';

/** Fails with the reason when the command was not built. */
export function needCommand(): void {
  if (!existsSync(command)) throw new Error(`${command} is missing: npm test builds it first`);
}

/** @param folder where it is run; the project's own unless given */
export const start = (args: string[], folder?: string): ChildProcess =>
  spawn(process.execPath, [absolute(command), ...args], { cwd: folder });

export interface Ran {
  code: number | null;
  out: string;
  errors: string;
}

/** Runs the built command to its end. */
export function run(args: string[], input?: string | Uint8Array, folder?: string): Promise<Ran> {
  return new Promise((resolve, reject) => {
    const child = start(args, folder);
    const ran: Ran = { code: null, out: '', errors: '' };
    child.stdout?.setEncoding('utf8').on('data', (text: string) => (ran.out += text));
    child.stderr?.setEncoding('utf8').on('data', (text: string) => (ran.errors += text));
    // The command stops reading at its limit; what is left to write then has nowhere to go.
    child.stdin?.on('error', () => undefined).end(input);
    child.on('error', reject).on('close', (code) => resolve({ ...ran, code }));
  });
}
