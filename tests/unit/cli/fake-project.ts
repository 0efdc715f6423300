import { spawn } from 'node:child_process';
import { cpSync, existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';

export interface Outcome {
  code: number | null;
  stdout: string;
  stderr: string;
}

/** Stands for npm: notes that it ran, then lays down what the lockfile asks for. `FAKE_NPM` makes it fail. */
const NPM = `
import { appendFileSync, mkdirSync, writeFileSync, readFileSync } from 'node:fs';
appendFileSync('log', 'npm ' + process.argv[2] + '\\n');
console.log('npm talks');
await new Promise((resolve) => setTimeout(resolve, 200));
if (process.env.FAKE_NPM) { console.error(process.env.FAKE_NPM); process.exit(1); }
for (const [path, code] of Object.entries(JSON.parse(readFileSync('modules.json', 'utf8')))) {
  mkdirSync(path.slice(0, path.lastIndexOf('/')), { recursive: true });
  writeFileSync(path, code);
}
writeFileSync('node_modules/.package-lock.json', readFileSync('package-lock.json'));
`;
const VITE = `
import { appendFileSync, mkdirSync, writeFileSync } from 'node:fs';
const files = process.argv.includes('--config') ? ['build-cli/start.js'] : ['build/handler.js', 'build-worker/worker.js'];
const folders = files.map((file) => file.slice(0, file.indexOf('/')));
appendFileSync('log', 'vite ' + folders[0] + '\\n');
console.log('vite talks');
await new Promise((resolve) => setTimeout(resolve, 200));
if (process.env.FAKE_VITE) { console.error(process.env.FAKE_VITE); process.exit(1); }
for (const folder of folders) mkdirSync(folder, { recursive: true });
for (const file of files) writeFileSync(file, '');
`;
const SYNC = `
import { appendFileSync, mkdirSync, writeFileSync } from 'node:fs';
appendFileSync('log', 'sync\\n');
mkdirSync('.svelte-kit', { recursive: true });
writeFileSync('.svelte-kit/tsconfig.json', '{}');
`;

/**
 * A project with the real prepare script and stand-ins for npm, Vite and svelte-kit, which are slow and need a
 * network. The stand-ins note in `log` that they ran; what prepare decides is then the order of the lines.
 */
export class FakeProject {
  readonly folder = mkdtempSync(join(tmpdir(), 'severalty-prepare-'));

  constructor() {
    mkdirSync(join(this.folder, 'src', 'cli'), { recursive: true });
    cpSync('src/cli/prepare.mjs', join(this.folder, 'src/cli/prepare.mjs'));
    cpSync('src/cli/prepare', join(this.folder, 'src/cli/prepare'), { recursive: true });
    this.write('package.json', '{"type":"module"}');
    this.lock('1.0.0');
    this.write('npm-cli.js', NPM);
    this.write('src/routes/page.txt', 'page');
    this.write('src/lib/engine.txt', 'engine');
    this.write('src/cli/tool.txt', 'tool');
    this.write(
      'modules.json',
      JSON.stringify({
        'node_modules/vite/bin/vite.js': VITE,
        'node_modules/vite/package.json': '{"type":"module"}',
        'node_modules/@sveltejs/kit/svelte-kit.js': SYNC,
        'node_modules/@sveltejs/kit/package.json': '{"type":"module"}',
        'node_modules/better-sqlite3/index.js': 'module.exports = class { close() {} };'
      })
    );
  }

  write(path: string, text: string): void {
    mkdirSync(dirname(join(this.folder, path)), { recursive: true });
    writeFileSync(join(this.folder, path), text);
  }

  /** A lockfile that asks for this version of vite. */
  lock(version: string): void {
    this.write(
      'package-lock.json',
      JSON.stringify({ packages: { '': {}, 'node_modules/vite': { version } } })
    );
  }

  /** What ran so far, in order. */
  log(): string[] {
    const path = join(this.folder, 'log');
    return existsSync(path) ? readFileSync(path, 'utf8').trim().split('\n') : [];
  }

  has(path: string): boolean {
    return existsSync(join(this.folder, path));
  }

  run(args: string[], env: Record<string, string> = {}): Promise<Outcome> {
    return this.start(args, env).done;
  }

  start(
    args: string[],
    env: Record<string, string> = {}
  ): { kill: (signal: NodeJS.Signals) => void; done: Promise<Outcome> } {
    const child = spawn(process.execPath, ['src/cli/prepare.mjs', ...args], {
      cwd: this.folder,
      env: { ...process.env, npm_execpath: join(this.folder, 'npm-cli.js'), ...env },
      stdio: ['ignore', 'pipe', 'pipe']
    });
    let stdout = '';
    let stderr = '';
    child.stdout.on('data', (chunk) => (stdout += chunk));
    child.stderr.on('data', (chunk) => (stderr += chunk));
    const done = new Promise<Outcome>((resolve) =>
      child.once('close', (code) => resolve({ code, stdout, stderr }))
    );
    return { kill: (signal) => child.kill(signal), done };
  }

  remove(): void {
    rmSync(this.folder, { recursive: true, force: true });
  }
}
