import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fingerprint } from './fingerprint.mjs';
import { run } from './run.mjs';

const CONFIGS = ['package.json', 'package-lock.json', 'tsconfig.json'];

/**
 * What is built: the folder, the proofs that a build ended, the sources it depends on, and Vite's arguments.
 * The stamp lies in the built folder, so removing the folder removes the stamp.
 */
export const TARGETS = {
  app: {
    folder: 'build',
    // The threads of the server are built with it, beside it: adapter-node empties its own folder.
    proofs: ['build/handler.js', 'build-worker/worker.js'],
    sources: [
      'src',
      'static',
      'svelte.config.js',
      'vite.config.ts',
      'vite.worker.config.ts',
      'tailwind.config.ts',
      ...CONFIGS
    ],
    leaveOut: (/** @type {string} */ path) => path === 'src/cli',
    args: ['build', '--logLevel', 'warn']
  },
  cli: {
    folder: 'build-cli',
    proofs: ['build-cli/start.js'],
    sources: ['src/cli', 'src/lib', 'vite.cli.config.ts', ...CONFIGS],
    leaveOut: (/** @type {string} */ path) => path.endsWith('.svelte') || path.startsWith('src/cli/prepare'),
    args: ['build', '--config', 'vite.cli.config.ts', '--logLevel', 'warn']
  }
};

/** @typedef {keyof typeof TARGETS} Target */

/** @param {string} root @param {Target} target @returns {boolean} whether the built folder is older than its sources */
export function buildNeeded(root, target) {
  const { folder, proofs } = TARGETS[target];
  const stamp = join(root, folder, '.stamp');
  if (!existsSync(stamp) || !proofs.every((proof) => existsSync(join(root, proof)))) return true;
  return readFileSync(stamp, 'utf8') !== sourcesOf(root, target);
}

/**
 * Builds one target with Vite.
 *
 * @param {string} root
 * @param {Target} target
 * @param {boolean} quiet
 * @returns {Promise<string | null>} what went wrong and what to do, or null
 */
export async function build(root, target, quiet) {
  const { folder, args } = TARGETS[target];
  // Taken before: sources edited while the build runs must look changed afterwards.
  const before = sourcesOf(root, target);
  const env = { ...process.env, NODE_ENV: 'production' };
  // Vite's remarks on other people's packages help nobody here; they are shown when the build fails.
  const options = { cwd: root, quiet, env, hushed: true };
  const { code, tail } = await run(process.execPath, ['node_modules/vite/bin/vite.js', ...args], options);
  if (code !== 0) process.stderr.write(tail);
  if (code !== 0)
    return `The build of ${folder}/ failed; Vite said why above. Correct the source it names, and try again.`;
  mkdirSync(join(root, folder), { recursive: true });
  writeFileSync(join(root, folder, '.stamp'), before);
  return null;
}

/** @param {string} root @param {Target} target */
function sourcesOf(root, target) {
  return fingerprint(root, TARGETS[target].sources, TARGETS[target].leaveOut);
}
