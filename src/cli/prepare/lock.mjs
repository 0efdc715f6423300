import { randomBytes } from 'node:crypto';
import { readFileSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { hostname } from 'node:os';
import { setTimeout as sleep } from 'node:timers/promises';

/** The owner touches the file this often; a file untouched for `STALE` belongs to nobody. */
const HEARTBEAT = 2_000;
const STALE = 20_000;

/**
 * Takes the lock file, waiting while another run holds it. A lock whose owner died (its process is gone, or
 * on another machine its heartbeat stopped) is taken over.
 *
 * @param {string} file
 * @param {() => void} onWait called once, when the wait begins
 * @returns {Promise<() => void>} gives the lock back
 */
export async function takeLock(file, onWait) {
  const token = `${process.pid} ${hostname()} ${randomBytes(8).toString('hex')}`;
  for (let waited = false; ;) {
    try {
      writeFileSync(file, token, { flag: 'wx' });
      break;
    } catch (error) {
      if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    }
    const dead = abandoned(file);
    // Two waiters may see the same dead lock: each waits a random while and looks again, so that the
    // second finds the first one's living lock and not the dead one.
    await sleep(dead ? 20 + Math.random() * 300 : 250);
    if (dead && abandoned(file) === dead) rmSync(file, { force: true });
    else if (!dead && !waited) {
      waited = true;
      onWait();
    }
  }
  const heart = setInterval(() => touch(file), HEARTBEAT);
  heart.unref();
  return () => {
    clearInterval(heart);
    if (read(file) === token) rmSync(file, { force: true });
  };
}

/** What a dead owner left in the file, or null when the lock is alive or gone. @param {string} file */
function abandoned(file) {
  const token = read(file);
  if (token === null) return null;
  let age;
  try {
    age = Date.now() - statSync(file).mtimeMs;
  } catch {
    return null;
  }
  if (age > STALE) return token || 'empty';
  const [pid, host] = token.split(' ');
  if (!pid || host !== hostname()) return null;
  try {
    process.kill(Number(pid), 0);
    return null;
  } catch (error) {
    // EPERM: it lives, under another user.
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'ESRCH' ? token : null;
  }
}

/** @param {string} file */
function read(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null;
  }
}

/** @param {string} file */
function touch(file) {
  try {
    utimesSync(file, new Date(), new Date());
  } catch {
    // Somebody removed the file by hand; the work goes on, and giving the lock back finds nothing.
  }
}
