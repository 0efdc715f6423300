import { spawn } from 'node:child_process';

/** Characters of a child's output kept for the message that explains its failure. */
const KEPT = 20_000;

/** @type {Set<import('node:child_process').ChildProcess>} */
const children = new Set();

/**
 * Runs a program to its end without standard input. In quiet mode its standard output goes to standard
 * error, so that a command that prints a document prints nothing else. A `hushed` program's output is only
 * kept, for the caller to show when it failed.
 *
 * @param {string} program
 * @param {string[]} args
 * @param {{ cwd: string, quiet: boolean, hushed?: boolean, env?: NodeJS.ProcessEnv }} options
 * @returns {Promise<{ code: number, tail: string }>} exit code (127 when it could not start) and the end of
 *   what it wrote
 */
export function run(program, args, { cwd, quiet, hushed = false, env = process.env }) {
  return new Promise((resolve) => {
    let tail = '';
    const child = spawn(program, args, { cwd, env, stdio: ['ignore', 'pipe', 'pipe'] });
    children.add(child);
    const keep = (/** @type {NodeJS.WriteStream} */ to) => (/** @type {Buffer} */ chunk) => {
      if (!hushed) to.write(chunk);
      tail = (tail + chunk).slice(-KEPT);
    };
    child.stdout.on('data', keep(quiet ? process.stderr : process.stdout));
    child.stderr.on('data', keep(process.stderr));
    child.on('error', (error) => {
      children.delete(child);
      resolve({ code: 127, tail: error.message });
    });
    child.on('close', (code, signal) => {
      children.delete(child);
      resolve({ code: code ?? (signal ? 128 : 1), tail });
    });
  });
}

/** Ends every program that `run` still waits for; for use when this process is told to stop. */
export function stopAll() {
  for (const child of children) child.kill('SIGTERM');
}
