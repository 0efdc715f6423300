import { eq } from 'drizzle-orm';
import { mkdirSync, mkdtempSync, rmSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { Worker } from 'node:worker_threads';
import { build } from 'vite';
import { databaseFile, openDatabase, type Database } from '$lib/server/db/client';
import { migrateDatabase } from '$lib/server/db/migrate';
import { membership } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { makeMember, makeTeam } from '../../../../support/people';

/** Two leads in a team, and each takes the other's or their own role away at the same instant. */
const ROUNDS = 40;

/** What each of the two does; of every pair just one may succeed. */
const DEEDS = [
  ['leave', 'leave'],
  ['step-down', 'step-down'],
  ['leave', 'step-down'],
  ['remove-other', 'remove-other'],
  ['lower-other', 'lower-other']
];

let folder: string;
let db: Database;

beforeAll(async () => {
  // Under the project, so that the built file finds the packages.
  const cache = resolve('node_modules', '.cache');
  mkdirSync(cache, { recursive: true });
  folder = mkdtempSync(join(cache, 'race-'));
  db = openDatabase(databaseFile(folder));
  migrateDatabase(db);
  await build({
    configFile: false,
    logLevel: 'error',
    resolve: { alias: { $lib: resolve('src/lib') } },
    build: {
      ssr: resolve('tests/support/race-worker.ts'),
      outDir: folder,
      emptyOutDir: false,
      rollupOptions: { output: { entryFileNames: 'race-worker.mjs' } }
    }
  });
});

afterAll(() => {
  db.$client.close();
  rmSync(folder, { recursive: true, force: true });
});

it('two leads who step down, leave or are removed at once leave one lead behind', async () => {
  const rounds = Array.from({ length: ROUNDS }, () => {
    const team = makeTeam(db);
    return [makeMember(db, team.id, 'lead'), makeMember(db, team.id, 'lead')];
  });
  const tasks = (side: 0 | 1) =>
    rounds.map((pair, round) => ({
      actor: pair[side],
      other: pair[1 - side].personId,
      deed: DEEDS[round % DEEDS.length][side]
    }));
  const gate = new SharedArrayBuffer(4 * ROUNDS);
  const answers = await Promise.all([0, 1].map((side) => run(gate, tasks(side as 0 | 1))));

  for (const [round, [first]] of rounds.entries()) {
    const left = db.select().from(membership).where(eq(membership.teamId, first.teamId)).all();
    expect(
      left.filter(({ role }) => role === 'lead'),
      JSON.stringify([answers[0][round], answers[1][round]])
    ).toHaveLength(1);
    expect([answers[0][round], answers[1][round]].filter(({ ok }) => ok)).toHaveLength(1);
  }
});

function run(
  gate: SharedArrayBuffer,
  tasks: { actor: Actor; other: string; deed: string }[]
): Promise<{ ok: boolean; reason?: string }[]> {
  return new Promise((done, failed) => {
    const worker = new Worker(join(folder, 'race-worker.mjs'), {
      workerData: { file: databaseFile(folder), gate, tasks }
    });
    worker.once('message', done);
    worker.once('error', failed);
  });
}
