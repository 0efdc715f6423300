import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

/**
 * One hash over names and contents of files and folders (walked in name order). Contents, not times: a
 * fresh checkout of the same sources must not look changed, and an edit within one clock tick must.
 *
 * @param {string} root
 * @param {string[]} paths relative to root; those that do not exist count as absent
 * @param {(path: string) => boolean} [leaveOut] true for files that do not matter
 * @returns {string}
 */
export function fingerprint(root, paths, leaveOut = () => false) {
  const hash = createHash('sha256').update(`${process.version} ${process.platform} ${process.arch}`);
  /** @param {string} path */
  const add = (path) => {
    const full = join(root, path);
    if (leaveOut(path) || !existsSync(full)) return;
    if (statSync(full).isDirectory()) {
      for (const name of readdirSync(full).sort()) add(`${path}/${name}`);
    } else {
      const bytes = readFileSync(full);
      hash.update(`\n${path} ${bytes.length}\n`).update(bytes);
    }
  };
  for (const path of paths) add(path);
  return hash.digest('hex');
}
