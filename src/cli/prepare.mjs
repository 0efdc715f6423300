/**
 * Makes the checkout ready to run: installs, synchronises and builds, each only when it is needed. Uses
 * nothing but Node's own modules, since it runs before anything is installed.
 *
 *   node src/cli/prepare.mjs [--build | --cli] [--quiet]
 *
 * --build: the application and the command line tools; --cli: the command line tools only; neither: packages
 * and generated types. --quiet: nothing on standard output (news and errors go to standard error).
 */
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build, buildNeeded, TARGETS } from './prepare/build.mjs';
import { ensureDriver, install, installReason } from './prepare/install.mjs';
import { takeLock } from './prepare/lock.mjs';
import { run, stopAll } from './prepare/run.mjs';

const root = fileURLToPath(new URL('../..', import.meta.url));
const options = process.argv.slice(2);
const quiet = options.includes('--quiet');
const targets = /** @type {import('./prepare/build.mjs').Target[]} */ (
  options.includes('--build') ? ['app', 'cli'] : options.includes('--cli') ? ['cli'] : []
);

/** @param {string} line */
const say = (line) => void (quiet ? process.stderr : process.stdout).write(`severalty: ${line}\n`);

const syncNeeded = () => !existsSync(join(root, '.svelte-kit', 'tsconfig.json'));
const driverUnknown = () => !existsSync(join(root, 'node_modules', '.severalty-platform'));
const nothingToDo = () =>
  installReason(root) === null &&
  !driverUnknown() &&
  !syncNeeded() &&
  !targets.some((target) => buildNeeded(root, target));

/** @returns {Promise<string | null>} what went wrong and what to do, or null */
async function prepare() {
  const reason = installReason(root);
  if (reason) {
    say(`${reason}: installing packages (about two minutes the first time).`);
    const trouble = await install(root, quiet, say);
    if (trouble) return trouble;
  }
  const trouble = await ensureDriver(root, quiet, say);
  if (trouble) return trouble;
  if (syncNeeded()) {
    const { code } = await run(process.execPath, ['node_modules/@sveltejs/kit/svelte-kit.js', 'sync'], {
      cwd: root,
      quiet
    });
    if (code !== 0)
      return 'The generated types could not be written (svelte-kit sync); the reason stands above.';
  }
  for (const target of targets) {
    if (!buildNeeded(root, target)) continue;
    say(`building ${TARGETS[target].folder}/ …`);
    const failure = await build(root, target, quiet);
    if (failure) return failure;
  }
  return null;
}

const [major, minor] = process.versions.node.split('.').map(Number);
if (major < 20 || (major === 20 && minor < 11)) {
  process.stderr.write(`severalty: Node 20.11 or newer is needed; this is ${process.version}.\n`);
  process.exit(1);
}

if (!nothingToDo()) {
  const giveBack = await takeLock(join(root, '.prepare.lock'), () =>
    say('another run is preparing this folder; waiting for it.')
  );
  for (const [signal, code] of /** @type {const} */ ([
    ['SIGINT', 130],
    ['SIGTERM', 143]
  ])) {
    process.on(signal, () => {
      stopAll();
      giveBack();
      process.exit(code);
    });
  }
  try {
    const trouble = await prepare();
    if (trouble) {
      process.stderr.write(`severalty: ${trouble}\n`);
      process.exitCode = 1;
    }
  } finally {
    giveBack();
  }
}
