import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { secondThread, type SecondThread } from '../../../../src/cli/shared/second-thread';
import type { FittedJob } from '$lib/stats/resampling/fitted-draws';

// Plain scripts in place of the bundle: what is held here is the wire, not the engine.
const scripts = {
  echo: `let jobs = 0;
    parentPort.on('message', ({ job, range }) => {
      if (job) jobs++;
      parentPort.postMessage([{ exceeds: range.from, divergence: jobs }]);
    });`,
  broken: `throw new Error('no engine here');`,
  stuck: `parentPort.on('message', () => { for (;;); });`
};

let folder: string;
const path = (name: keyof typeof scripts) => join(folder, `${name}.mjs`);
const job = { data: {}, levels: {}, logLikelihood: -1, seed: 1 } as FittedJob;
const range = (from: number) => ({ from, to: from + 1, wanted: 1 });

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), 'second-thread-'));
  for (const [name, body] of Object.entries(scripts)) {
    writeFileSync(
      path(name as keyof typeof scripts),
      `import { parentPort } from 'node:worker_threads';\n${body}`
    );
  }
});
afterAll(() => rmSync(folder, { recursive: true }));

/** Two cores are what this project is held on; with one there is no thread to test. */
function thread(name: keyof typeof scripts): SecondThread {
  const made = secondThread(path(name));
  if (!made) throw new Error('this machine has one core');
  return made;
}

describe('secondThread', () => {
  it('gives each range its own answer, and sends the job once', async () => {
    const helper = thread('echo');
    const answers = await Promise.all([5, 6, 7].map((from) => helper.answers(job, range(from))));
    expect(answers.flat()).toEqual([5, 6, 7].map((exceeds) => ({ exceeds, divergence: 1 })));
    helper.end();
  });

  it('rejects when the script fails', async () => {
    const helper = thread('broken');
    await expect(helper.answers(job, range(0))).rejects.toThrow('no engine here');
    await expect(helper.answers(job, range(1))).rejects.toThrow('no engine here');
    helper.end();
  });

  it('ends a thread in the middle of its work, and says so to those who wait', async () => {
    const helper = thread('stuck');
    const waiting = helper.answers(job, range(0));
    setTimeout(() => helper.end(), 100);
    await expect(waiting).rejects.toThrow('has ended');
  });

  it('starts nothing until it is asked', () => {
    // A script that does not exist would fail at once.
    expect(() => secondThread(join(folder, 'missing.mjs'))?.end()).not.toThrow();
  });
});
