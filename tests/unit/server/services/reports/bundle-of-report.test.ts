import { bundleFiles, type Bundle } from '$lib/model/exports/bundle-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import type { Actor } from '$lib/server/services/access/actor';
import { bundleOfReport } from '$lib/server/services/reports/bundle-of-report';
import { readReport } from '$lib/server/services/reports/read-report';
import { beforeAll, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { makeDataset, makeReport } from '../../../../support/saved-reports';

let db: ReturnType<typeof freshDatabase>;
let observer: Actor;
let stranger: Actor;
/** A report of a file of its own, and one of a file that holds several datasets. */
let [whole, part]: string[] = [];
let bundle: Bundle;

async function make(id: string): Promise<Bundle> {
  const found = await bundleOfReport(db, observer, id, 'https://severalty.example/team/x/reports/y');
  if (!found.ok) throw new Error(found.reason);
  return bundleFiles({ ...found.input, charts: {} });
}

beforeAll(async () => {
  db = freshDatabase();
  const team = makeTeam(db);
  observer = makeMember(db, team.id, 'observer');
  stranger = makeMember(db, makeTeam(db).id, 'lead');
  [whole, part] = await Promise.all(
    [null, 'one of two'].map(async (part) => {
      const datasetId = makeDataset(db, team.id, observer.personId, { part });
      return (await makeReport(db, { teamId: team.id, datasetId }, {}, 1_700_000_000_000)).id;
    })
  );
  bundle = await make(whole);
});

describe('bundleOfReport', () => {
  it('has the document as stored, when and of whom it is, and the uploaded file', () => {
    const read = readReport(db, observer, whole);
    if (!read.ok) throw new Error(read.reason);
    const text = (path: string) => new TextDecoder().decode(bundle.files.get(path));
    expect(text('document.json')).toBe(read.report.text);
    expect(text('README.txt')).toContain('2023-11-14 22:13 UTC');
    expect(bundle.files.has('original/f.csv')).toBe(true);
  });

  it('gives the same bytes a second time', async () => {
    expect(Buffer.compare(zipBundle(bundle), zipBundle(await make(whole)))).toBe(0);
  });

  it('leaves out a file that holds other datasets too', async () => {
    expect([...(await make(part)).files.keys()].filter((path) => path.startsWith('original'))).toEqual([]);
  });

  it('knows no report of another team', async () => {
    expect(await bundleOfReport(db, stranger, whole, 'x')).toEqual({ ok: false, reason: 'unknown' });
  });
});
