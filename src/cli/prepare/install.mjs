import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { run } from './run.mjs';

/** Compiled modules work for one platform and one Node binary interface only. */
const PLATFORM = `${process.platform} ${process.arch} ${process.versions.modules}`;
const stampFile = (/** @type {string} */ root) => join(root, 'node_modules', '.severalty-platform');

/**
 * Why the packages must be installed, in words; null when node_modules agrees with the lockfile.
 * npm keeps its own record of what it installed; it is compared entry by entry, so packages installed by
 * hand with plain `npm ci` are accepted as they are.
 *
 * @param {string} root
 * @returns {string | null}
 */
export function installReason(root) {
  const record = join(root, 'node_modules', '.package-lock.json');
  if (!existsSync(record))
    return existsSync(join(root, 'node_modules')) ? 'node_modules is incomplete' : 'node_modules is missing';
  const wanted = packagesOf(join(root, 'package-lock.json'));
  const present = packagesOf(record);
  for (const [path, entry] of Object.entries(wanted)) {
    if (path === '' || entry.link) continue;
    const found = present[path];
    const name = path.replace(/^.*node_modules\//, '');
    // Optional packages are for other platforms more often than not.
    if (!found && (entry.optional || entry.devOptional || entry.peer)) continue;
    if (!found) return `${name} is not installed`;
    if (found.version !== entry.version)
      return `${name} is ${found.version}, the lockfile says ${entry.version}`;
  }
  if (existsSync(stampFile(root)) && readFileSync(stampFile(root), 'utf8') !== PLATFORM)
    return 'node_modules was installed for another platform or Node version';
  return null;
}

/**
 * Installs from the lockfile with the development packages, whatever NODE_ENV says.
 *
 * @param {string} root
 * @param {boolean} quiet
 * @param {(line: string) => void} say
 * @returns {Promise<string | null>} what went wrong and what to do, or null
 */
export async function install(root, quiet, say) {
  // `npm run --silent` hands its silence down; an error must still be seen.
  const args = ['ci', '--include=dev', '--no-audit', '--no-fund', '--loglevel=error'];
  let { code, tail } = await npm(root, quiet, [...args, '--prefer-offline']);
  if (code !== 0 && code !== 127 && !/EUSAGE|gyp ERR!/.test(tail)) {
    say('That failed; once more without trusting the local package cache.');
    ({ code, tail } = await npm(root, quiet, [...args, '--prefer-online']));
  }
  return code === 0 ? null : advice(code, tail);
}

/**
 * Makes sure that the compiled database driver loads in this Node, and compiles it where it does not
 * (packages installed with scripts switched off, or by another Node).
 *
 * @param {string} root
 * @param {boolean} quiet
 * @param {(line: string) => void} say
 * @returns {Promise<string | null>} what went wrong and what to do, or null
 */
export async function ensureDriver(root, quiet, say) {
  if (existsSync(stampFile(root))) return null;
  const probe = ['--input-type=commonjs', '-e', "new (require('better-sqlite3'))(':memory:').close()"];
  const tryOut = () => run(process.execPath, probe, { cwd: root, quiet: true });
  if ((await tryOut()).code !== 0) {
    say('The database driver does not load in this Node; compiling it (a minute or two).');
    const { code, tail } = await npm(root, quiet, [
      'rebuild',
      'better-sqlite3',
      '--ignore-scripts=false',
      '--loglevel=error'
    ]);
    if (code !== 0 || (await tryOut()).code !== 0) return advice(code || 1, `gyp ERR! ${tail}`);
  }
  writeFileSync(stampFile(root), PLATFORM);
  return null;
}

/** @param {string} root @param {boolean} quiet @param {string[]} args */
function npm(root, quiet, args) {
  const script = process.env.npm_execpath;
  if (script && /npm-cli\.c?js$/.test(script))
    return run(process.execPath, [script, ...args], { cwd: root, quiet });
  return run('npm', args, { cwd: root, quiet });
}

/** @param {number} code @param {string} tail */
function advice(code, tail) {
  if (code === 127) return 'npm was not found. Install Node 20 with npm, and try again.';
  if (/EUSAGE/.test(tail))
    return 'package.json and package-lock.json disagree. Run `npm install`, and commit the lockfile.';
  if (/gyp ERR!/.test(tail))
    return 'The database driver (better-sqlite3) could not be compiled. It needs python3, make and a C++ compiler (Debian: apt-get install python3 make g++). Install them, and try again.';
  if (/ENOTFOUND|EAI_AGAIN|ETIMEDOUT|ECONNREFUSED|ECONNRESET|network/i.test(tail))
    return 'The package registry could not be reached. Check the network or proxy settings of npm, and try again.';
  if (/EACCES|EPERM/.test(tail))
    return 'No right to write into this folder. Make it yours (chown), and try again.';
  if (/ENOSPC/.test(tail)) return 'The disk is full. About 700 MB are needed.';
  return 'The packages could not be installed; npm said why above. Remove node_modules, and try again.';
}

/** @param {string} file @returns {Record<string, { version?: string, optional?: boolean, devOptional?: boolean, peer?: boolean, link?: boolean }>} */
function packagesOf(file) {
  return JSON.parse(readFileSync(file, 'utf8')).packages;
}
