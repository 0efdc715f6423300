import { importArchive } from '$lib/server/services/transfer/import-archive';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '$lib/server/db/client';
import type { Actor } from '$lib/server/services/access/actor';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { inventedCounts } from '../../../../support/saved-reports';

let archive: Uint8Array;
let db: Database;
let lead: Actor;

beforeAll(async () => {
  db = freshDatabase();
  lead = makeMember(db, makeTeam(db).id, 'lead');
  makeTrueDataset(db, lead, { kind: 'shots', shots: [1, 0], batches: null });
  makeTrueDataset(db, lead, inventedCounts);
  archive = await archiveOf(db, lead);
});

/** What is said, and how many million bytes of the heap it took. */
function refused(changes: Record<string, string>) {
  const bytes = tampered(archive, changes);
  // Under the limit of how tightly a file may be packed, or another one would speak.
  const before = process.memoryUsage().heapUsed;
  const answer = importArchive(db, lead, bytes);
  const taken = (process.memoryUsage().heapUsed - before) / 1e6;
  if (answer.ok || !('what' in answer)) throw new Error('it was taken');
  return { what: answer.what, taken };
}

/** Varied, so that it packs no better than an honest file may. */
const varied = (count: number, one: (i: number) => string) =>
  Array.from({ length: count }, (_, i) => one((Math.imul(i, 0x9e3779b1) >>> 8) % 10_000)).join(',');

describe('a file of an archive that holds far too much', () => {
  it('half a million counts that are none are told by the first', () => {
    const path = 'datasets/00001.json';
    const text = textsOf(archive)[path];
    const shots = `"shots": [${varied(500_000, (i) => `-${i + 1}`)}]`;
    const changed = text.replace(/"shots": \[[^\]]*\]/, shots);
    expect(changed).not.toBe(text);
    const { what, taken } = refused({ [path]: changed });
    expect(what).toMatch(/^datasets\/00001\.json: counts\.shots\.0: /);
    expect(taken).toBeLessThan(150);
  });

  it.each([
    ['people', 'team.json', `{"members": [${varied(300_000, (i) => `{"a":${i}}`)}]}`],
    ['reports', 'reports.json', `[${varied(200_000, (i) => `{"a":${i}}`)}]`],
    ['brackets', 'reports.json', '['.repeat(900_000)]
  ])('%s', (_, path, text) => {
    const { what, taken } = refused({ [path]: text });
    expect(what).toContain(path);
    expect(taken).toBeLessThan(150);
  });
});
