import { zipSync } from 'fflate';
import type { Database } from '$lib/server/db/client';
import { dataset, event, originalFile, report } from '$lib/server/db/schema';
import type { Actor } from '$lib/server/services/access/actor';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, tampered, textsOf } from '../../../../support/archives';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { inventedCounts, makeReport } from '../../../../support/saved-reports';

let archive: Uint8Array;
let files: Record<string, string>;
let db: Database;
let lead: Actor;

beforeAll(async () => {
  const from = freshDatabase();
  const actor = makeMember(from, makeTeam(from).id, 'lead');
  const datasetId = makeTrueDataset(from, actor, inventedCounts);
  makeTrueDataset(from, actor, { kind: 'shots', shots: [1, 0], batches: null }, { name: 'Shots' });
  await makeReport(from, { teamId: actor.teamId, datasetId });
  archive = await archiveOf(from, actor);
  files = textsOf(archive);
});

beforeEach(() => {
  db = freshDatabase();
  lead = makeMember(db, makeTeam(db).id, 'lead');
});

/** Imports, and holds that nothing at all was left behind. */
function refusalOf(bytes: Uint8Array) {
  const answer = importArchive(db, lead, bytes);
  expect(answer.ok).toBe(false);
  for (const table of [dataset, report, originalFile, event])
    expect(db.select().from(table).all()).toEqual([]);
  return answer as Extract<typeof answer, { what: string }>;
}

/** A file of the archive with one thing in it changed, the manifest fitting. */
const changed = (path: string, from: string | RegExp, to: string) => {
  const text = files[path].replace(from, to);
  expect(text).not.toBe(files[path]);
  return tampered(archive, { [path]: text });
};

describe('a bad archive is refused whole', () => {
  it('tampered() itself breaks nothing', () => {
    expect(importArchive(db, lead, tampered(archive, {})).ok).toBe(true);
  });

  it.each([
    ['nothing', () => new Uint8Array()],
    ['a text', () => new TextEncoder().encode('count,shots\n0,3\n')],
    ['half an upload', () => archive.slice(0, archive.length / 2)],
    ['the other half', () => archive.slice(archive.length / 2)]
  ])('%s is no zip', (_, bytes) => expect(refusalOf(bytes()).reason).toBe('not-a-zip'));

  it.each(['../../etc/passwd', '/etc/passwd', 'datasets/../x.json', 'originals/x', '__proto__', 'a\\b'])(
    'the name %s',
    (name) => {
      // The library cannot write __proto__ itself, so the name is written over another one.
      const plain = zipSync({
        'manifest.json': new Uint8Array(),
        [name.replaceAll('_', '-')]: new Uint8Array(1)
      });
      const bytes = Buffer.from(
        Buffer.from(plain).toString('latin1').replaceAll('--proto--', '__proto__'),
        'latin1'
      );
      expect(refusalOf(bytes).reason).toBe('not-an-archive');
    }
  );

  it('another format, or no manifest', () => {
    expect(refusalOf(tampered(archive, { 'manifest.json': null }, { fitManifest: false })).reason).toBe(
      'not-an-archive'
    );
    expect(refusalOf(changed('manifest.json', 'severalty.team/1', 'severalty.team/2')).reason).toBe(
      'not-an-archive'
    );
  });

  it('a file changed, missing or added', () => {
    const plain = { fitManifest: false };
    const edited = files['datasets/00001.csv'].replace('30', '31');
    expect(refusalOf(tampered(archive, { 'datasets/00001.csv': edited }, plain))).toMatchObject({
      reason: 'damaged',
      what: 'datasets/00001.csv is not as the manifest lists it.'
    });
    expect(refusalOf(tampered(archive, { 'datasets/00001.csv': null }, plain)).reason).toBe('damaged');
    expect(refusalOf(tampered(archive, { 'datasets/00009.csv': 'x' }, plain)).reason).toBe('damaged');
  });

  it('a bit that turned over on the way', () => {
    const bytes = archive.slice();
    bytes[Math.floor(bytes.length / 3)] ^= 4;
    expect(['damaged', 'not-a-zip']).toContain(refusalOf(bytes).reason);
  });

  it('a bomb: by ratio, by size, and by sizes that are lies', () => {
    const zeros = (size: number) => new Uint8Array(size);
    const packed = zipSync({ 'README.txt': zeros(2e6) });
    expect(refusalOf(packed).reason).toBe('too-large');
    const stored = zipSync({ 'README.txt': zeros(65 * 1024 * 1024) }, { level: 0 });
    expect(refusalOf(stored).reason).toBe('too-large');
    // The directory claims 10 bytes for what unpacks to two million.
    const lie = packed.slice();
    const directory = lie.length - 22 - 46 - 'README.txt'.length;
    new DataView(lie.buffer).setUint32(directory + 24, 10, true);
    expect(refusalOf(lie)).toMatchObject({ reason: 'damaged', what: expect.stringContaining('unpack') });
  });

  it.each([
    ['counts that are not those of the digest', 'datasets/00001.json', '30\n', '31\n', /digest/],
    ['a negative count', 'datasets/00002.json', /"shots": \[\s+1/, '"shots": [ -1', /shots/],
    ['an unknown key', 'datasets/00001.json', '"part"', '"parts": 1,\n  "part"', /parts/],
    ['a bad day', 'datasets/00001.json', '"measuredOn": null', '"measuredOn": "2026-02-30"', /day/],
    ['trials below a count', 'datasets/00001.json', '"trials": null', '"trials": 1', /datasets\/00001/],
    [
      'an original that is not there',
      'datasets/00001.json',
      /"sha256": "\w{4}/,
      '"sha256": "0000',
      /missing/
    ],
    [
      'a verdict that no document has',
      'reports/00001.json',
      /"verdict": "[\w-]+"/,
      '"verdict": "sure"',
      /verdict/
    ],
    [
      'a document that was edited',
      'reports/00001.json',
      '"alpha": 0.01',
      '"alpha": 0.02',
      /not the document/
    ],
    [
      'a report of a dataset that is not there',
      'reports.json',
      'datasets/00001',
      'datasets/00007',
      /not in the archive/
    ],
    ['a report of other counts', 'reports.json', 'datasets/00001', 'datasets/00002', /other counts/],
    ['no JSON', 'reports.json', '[', '', /reports\.json/]
  ])('%s', (_, path, from, to, why) => {
    const refusal = refusalOf(changed(path, from, to));
    expect(refusal.reason).toBe('bad-file');
    expect(refusal.what).toMatch(why);
  });

  it('a remark that answers none, or itself', () => {
    const remark = {
      section: 'answer',
      body: 'x',
      signedAs: 'A',
      at: '2026-01-01T00:00:00.000Z',
      link: null,
      settledAt: null
    };
    for (const bad of [
      { ...remark, thread: 0 },
      { ...remark, thread: null, link: 3 }
    ]) {
      const list = JSON.parse(files['reports.json']) as { remarks: unknown[] }[];
      list[0].remarks = [bad];
      expect(refusalOf(tampered(archive, { 'reports.json': JSON.stringify(list) })).reason).toBe('bad-file');
    }
  });

  it('leaves nothing when the database fails at the last row', () => {
    db.$client.exec(
      `create trigger fail before insert on report begin select raise(abort, 'disk full'); end`
    );
    expect(() => importArchive(db, lead, archive)).toThrow('disk full');
    for (const table of [dataset, report, originalFile, event])
      expect(db.select().from(table).all()).toEqual([]);
  });
});
