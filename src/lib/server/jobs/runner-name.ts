import { randomBytes } from 'node:crypto';
import { hostname } from 'node:os';

/** Milliseconds between two signs of life of a runner. */
export const HEARTBEAT = 3_000;
/** A runner that missed ten of them is gone, wherever it ran. */
const SILENT = 30_000;

/** Runners alive in this process; on globalThis, since a development server loads this file anew at every change. */
const holder = globalThis as { [living: symbol]: Set<string> | undefined };
const living = (holder[Symbol.for('severalty.runners')] ??= new Set<string>());

/** A name for a runner: process, machine, and a part that no other has. */
export function newRunnerName(): string {
  const name = `${process.pid} ${hostname()} ${randomBytes(6).toString('hex')}`;
  living.add(name);
  return name;
}

export function forgetRunner(name: string): void {
  living.delete(name);
}

/**
 * Whether the runner of a job is gone. A process of this machine is asked for; after SIGKILL that tells at once. For
 * another machine, or a process number that was given again, the heartbeat decides.
 */
export function isGone(runner: string | null, heartbeatAt: number | null, now: number): boolean {
  if (runner === null) return true;
  const silent = now - (heartbeatAt ?? 0) > SILENT;
  const [pid, host] = runner.split(' ');
  if (host !== hostname()) return silent;
  // In a container every start has the same process number.
  if (Number(pid) === process.pid) return !living.has(runner);
  try {
    process.kill(Number(pid), 0);
    return silent;
  } catch (error) {
    // EPERM: it lives, under another user.
    return (error as NodeJS.ErrnoException).code === 'ESRCH' || silent;
  }
}
