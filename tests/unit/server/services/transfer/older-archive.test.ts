import { dataset } from '$lib/server/db/schema';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const path = 'datasets/00001.json';

/** An archive of one dataset of the group "north edge". */
async function groupArchive() {
  const db = freshDatabase();
  const lead = makeMember(db, makeTeam(db, 'ours').id, 'lead');
  makeTrueDataset(
    db,
    lead,
    {
      kind: 'histogram',
      counts: [
        [0, 70],
        [1, 30]
      ],
      lump: null
    },
    { group: 'north edge' }
  );
  return archiveOf(db, lead);
}

async function groupAfterImport(archive: Uint8Array) {
  const db = freshDatabase();
  const lead = makeMember(db, makeTeam(db).id, 'lead');
  expect(importArchive(db, lead, archive)).toMatchObject({ ok: true, datasets: 1 });
  return db.select().from(dataset).all()[0].group;
}

it('the group of a dataset goes through an archive', async () => {
  expect(await groupAfterImport(await groupArchive())).toBe('north edge');
});

it('an archive made before datasets had groups is read, and states none', async () => {
  const archive = await groupArchive();
  const file = JSON.parse(textsOf(archive)[path]) as { conditions: Record<string, unknown> };
  expect(file.conditions.group).toBe('north edge');
  delete file.conditions.group;
  expect(await groupAfterImport(tampered(archive, { [path]: JSON.stringify(file) }))).toBeNull();
});
