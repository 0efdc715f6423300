import { parentPort, workerData } from 'node:worker_threads';
import { openDatabase } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { changeRole } from '$lib/server/services/teams/change-role';
import { removeMember } from '$lib/server/services/teams/remove-member';

/** One of two threads, each with a connection of its own; they meet at a gate before every task. */
const { file, gate, tasks } = workerData as {
  file: string;
  gate: SharedArrayBuffer;
  tasks: { actor: Actor; other: string; deed: string }[];
};
const db = openDatabase(file);
const here = new Int32Array(gate);
const answers = tasks.map(({ actor, other, deed }, round) => {
  // Spinning, since a wait would let one of the two wake up later than the other.
  Atomics.add(here, round, 1);
  while (Atomics.load(here, round) < 2);
  if (deed === 'leave') return removeMember(db, actor, actor.personId);
  if (deed === 'remove-other') return removeMember(db, actor, other);
  if (deed === 'lower-other') return changeRole(db, actor, other, 'observer');
  return changeRole(db, actor, actor.personId, 'observer');
});
db.$client.close();
parentPort?.postMessage(answers);
