import { readCounts } from '$lib/formats/read-counts';
import { dataset, report } from '$lib/server/db/schema';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { saveReport } from '$lib/server/services/reports/save-report';
import type { CountData, Diagnosis } from '$lib/stats/types';
import { expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { diagnoseInvented } from '../../../../support/saved-reports';

const data: CountData = {
  kind: 'histogram',
  counts: [
    [3, 50],
    [4, 41]
  ],
  lump: { from: 5, shots: 9 },
  below: { to: 2, shots: 60 }
};

/** A team with counts lumped at both ends and a report of them. */
async function lumpedTeam() {
  const db = freshDatabase();
  const lead = makeMember(db, makeTeam(db, 'ours').id, 'lead');
  const datasetId = makeTrueDataset(db, lead, data);
  const made = await diagnoseInvented({}, data);
  db.transaction((tx) =>
    saveReport(tx, { teamId: lead.teamId, datasetId, createdBy: lead.personId, ...made })
  );
  return { db, lead };
}

it('an opening row goes through export, import and export to the byte', async () => {
  const { db, lead } = await lumpedTeam();
  const archive = await archiveOf(db, lead);
  const before = textsOf(archive);
  expect(before['datasets/00001.csv']).toMatch(/\r\ncount,shots\r\n0-2,60\r\n3,50\r\n4,41\r\n5\+,9\r\n$/);
  expect(readCounts(before['datasets/00001.csv'])).toMatchObject({ ok: true, datasets: [{ data }] });
  expect((JSON.parse(before['reports/00001.json']) as Diagnosis).data.below).toEqual({ to: 2, shots: 60 });

  const other = freshDatabase();
  const newLead = makeMember(other, makeTeam(other).id, 'lead');
  expect(importArchive(other, newLead, archive)).toMatchObject({ ok: true, datasets: 1, reports: 1 });
  const [kept] = other.select().from(dataset).all();
  expect(JSON.parse(kept.counts)).toEqual(data);
  expect(other.select().from(report).all()[0].document).toBe(before['reports/00001.json']);
  const after = textsOf(await archiveOf(other, newLead));
  const same = Object.keys(before).filter((path) => /^(datasets|reports|originals)\//.test(path));
  expect(same).toHaveLength(4);
  for (const path of same) expect(after[path], path).toBe(before[path]);
});

it('an archive whose opening row was changed, into another, one that overlaps or none at all, is refused', async () => {
  const { db, lead } = await lumpedTeam();
  const archive = await archiveOf(db, lead);
  const path = 'datasets/00001.json';
  const text = textsOf(archive)[path];
  expect(text).toMatch(/"below":\s*\{\s*"to":\s*2/);
  for (const wrong of [1, 3, 5, -1, 1.5]) {
    const changed = tampered(archive, { [path]: text.replace(/("below":\s*\{\s*"to":\s*)2/, `$1${wrong}`) });
    expect(importArchive(db, lead, changed, true), String(wrong)).toMatchObject({ ok: false });
  }
});
