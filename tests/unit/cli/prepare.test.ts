import { utimesSync } from 'node:fs';
import { hostname } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { FakeProject } from './fake-project';

let project: FakeProject;
beforeEach(() => {
  project = new FakeProject();
});
afterEach(() => project.remove());

const EVERYTHING = ['npm ci', 'sync', 'vite build', 'vite build-cli'];

describe('prepare on a bare clone', () => {
  it('installs, synchronises and builds, and the second time does nothing and says nothing', async () => {
    const first = await project.run(['--build']);
    expect(first.code).toBe(0);
    expect(first.stdout).toMatch(/node_modules is missing: installing/);
    expect(project.log()).toEqual(EVERYTHING);
    const second = await project.run(['--build']);
    expect(second).toEqual({ code: 0, stdout: '', stderr: '' });
    expect(project.log()).toEqual(EVERYTHING);
    expect(project.has('.prepare.lock')).toBe(false);
  });

  it('builds only the command line tools with --cli, and nothing without an option', async () => {
    await project.run([]);
    expect(project.log()).toEqual(['npm ci', 'sync']);
    await project.run(['--cli']);
    expect(project.log()).toEqual(['npm ci', 'sync', 'vite build-cli']);
  });

  it('writes nothing on standard output with --quiet, whatever npm says', async () => {
    const { code, stdout, stderr } = await project.run(['--cli', '--quiet']);
    expect(code).toBe(0);
    expect(stdout).toBe('');
    expect(stderr).toMatch(/npm talks/);
  });

  it('lets two runs at once install and build once', async () => {
    const [one, two, three] = await Promise.all([
      project.run(['--build']),
      project.run(['--build']),
      project.run(['--cli', '--quiet'])
    ]);
    expect([one.code, two.code, three.code]).toEqual([0, 0, 0]);
    expect(three.stdout).toBe('');
    expect([...project.log()].sort()).toEqual([...EVERYTHING].sort());
  });
});

describe('prepare on a prepared folder', () => {
  beforeEach(async () => {
    await project.run(['--build']);
  });
  const since = () => project.log().slice(EVERYTHING.length);

  it('rebuilds what depends on the file that changed', async () => {
    project.write('src/routes/page.txt', 'another page');
    await project.run(['--build']);
    expect(since()).toEqual(['vite build']);
    project.write('src/cli/tool.txt', 'another tool');
    await project.run(['--build']);
    expect(since()).toEqual(['vite build', 'vite build-cli']);
    project.write('src/lib/engine.txt', 'another engine');
    await project.run(['--build']);
    expect(since().slice(2)).toEqual(['vite build', 'vite build-cli']);
  });

  it('does not mind new times on old contents', async () => {
    utimesSync(join(project.folder, 'src/lib/engine.txt'), new Date(), new Date());
    await project.run(['--build']);
    expect(since()).toEqual([]);
  });

  it('installs again when the lockfile asks for another version, and says which', async () => {
    project.lock('2.0.0');
    const { stdout } = await project.run(['--build']);
    expect(stdout).toMatch(/vite is 1\.0\.0, the lockfile says 2\.0\.0/);
    expect(since()[0]).toBe('npm ci');
  });

  it('installs again for another platform', async () => {
    project.write('node_modules/.severalty-platform', 'toaster mips 1');
    const { stdout } = await project.run([]);
    expect(stdout).toMatch(/another platform or Node version/);
    expect(since()[0]).toBe('npm ci');
  });

  it('takes over a lock whose owner is gone, and one whose heart stopped', async () => {
    project.write('src/cli/tool.txt', 'changed');
    // No process has this number: Linux stops at 2^22.
    project.write('.prepare.lock', `99999999 ${hostname()} token`);
    expect((await project.run(['--cli'])).code).toBe(0);
    project.write('src/cli/tool.txt', 'changed again');
    project.write('.prepare.lock', `1 another-machine token`);
    const old = new Date(Date.now() - 60_000);
    utimesSync(join(project.folder, '.prepare.lock'), old, old);
    expect((await project.run(['--cli'])).code).toBe(0);
    expect(since()).toEqual(['vite build-cli', 'vite build-cli']);
    expect(project.has('.prepare.lock')).toBe(false);
  });
});

describe('prepare that fails', () => {
  it.each([
    ['gyp ERR! build error', /C\+\+ compiler/],
    ['npm error code EUSAGE', /Run `npm install`, and commit the lockfile/],
    ['npm error code ENOTFOUND', /registry could not be reached/],
    ['npm error code EACCES', /chown/],
    ['npm error code ENOSPC', /disk is full/],
    ['something else', /Remove node_modules, and try again/]
  ])('on "%s" says what to do', async (words, advice) => {
    const { code, stderr } = await project.run(['--build'], { FAKE_NPM: words });
    expect(code).toBe(1);
    expect(stderr).toContain(words);
    expect(stderr).toMatch(advice);
    expect(project.has('.prepare.lock')).toBe(false);
  });

  it('shows what Vite said, and tries again the next time', async () => {
    const { code, stderr } = await project.run(['--cli'], { FAKE_VITE: 'src/cli/x.ts does not parse' });
    expect(code).toBe(1);
    expect(stderr).toMatch(/x\.ts does not parse[^]*build of build-cli\/ failed/);
    expect((await project.run(['--cli'])).code).toBe(0);
  });

  it('gives the lock back when it is told to stop', async () => {
    const running = project.start(['--build']);
    while (!project.has('.prepare.lock')) await new Promise((resolve) => setTimeout(resolve, 10));
    // The handlers are set just after the lock is taken.
    await new Promise((resolve) => setTimeout(resolve, 100));
    running.kill('SIGTERM');
    expect((await running.done).code).toBe(143);
    expect(project.has('.prepare.lock')).toBe(false);
  });
});
