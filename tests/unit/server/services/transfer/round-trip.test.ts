import { createHash } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { dataset, event, link, membership, person, remark, report } from '$lib/server/db/schema';
import { listEvents } from '$lib/server/services/events/list-events';
import { exportTeam } from '$lib/server/services/transfer/export-team';
import { importArchive } from '$lib/server/services/transfer/import-archive';
import { beforeAll, describe, expect, it } from 'vitest';
import { archiveOf, makeTrueDataset, textsOf } from '../../../../support/archives';
import { fullTeam } from '../../../../support/full-team';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';
import { diagnoseInvented, inventedCounts } from '../../../../support/saved-reports';

let full: Awaited<ReturnType<typeof fullTeam>>;
let archive: Uint8Array;

beforeAll(async () => {
  full = await fullTeam();
  archive = await archiveOf(full.db, full.lead, Date.UTC(2026, 2, 14));
});

describe('an archive', () => {
  it('says what it does not carry', () => {
    expect(textsOf(archive)['README.txt']).toMatch(
      /Not in here: links to sweeps.*maps of sites.*rules of gates.*webhooks/s
    );
  });

  it('lists every file with its sha256, as anybody can check', () => {
    const files = textsOf(archive);
    const manifest = JSON.parse(files['manifest.json']) as {
      files: { path: string; sha256: string }[];
    };
    expect(manifest).toMatchObject({
      format: 'severalty.team/1',
      madeAt: '2026-03-14T00:00:00.000Z',
      team: { name: 'Team ours', slug: 'ours' },
      leftOut: { datasets: 1, reports: 0 }
    });
    expect(manifest.files.map(({ path }) => path).sort()).toEqual(
      Object.keys(files)
        .filter((path) => path !== 'manifest.json')
        .sort()
    );
    for (const { path, sha256 } of manifest.files)
      expect(createHash('sha256').update(files[path]).digest('hex'), path).toBe(sha256);
  });

  it('carries the documents byte for byte, and counts that other programs read', () => {
    const files = textsOf(archive);
    const { document } = full.db.select().from(report).where(eq(report.id, full.reportId)).get() ?? {};
    expect(files['reports/00001.json']).toBe(document);
    expect(files['datasets/00001.csv']).toMatch(
      /# device: Heron C\r\n(#.*\r\n)*count,shots\r\n0,30\r\n1,50\r\n2,20\r\n$/
    );
    expect(files['datasets/00001.csv']).toMatch(/# notes: first second line/);
    expect(files['datasets/00002.csv']).toMatch(/1,a,2\r\n2,'=b,0\r\n3,"a,c",1\r\n$/);
    expect(files['datasets/00003.csv']).toMatch(/2,20\r\n3\+,4\r\n$/);
    expect(JSON.parse(files['reports.json'])).toMatchObject([
      { number: 1, conditions: { device: 'Heron "B", 2' }, dataset: 'datasets/00001.json' },
      { number: 2 }
    ]);
  });

  it('holds no secrets: no hashes of passwords or tokens, and no name of a hidden referee', () => {
    const all = Object.values(textsOf(archive)).join('\n');
    expect(all).toContain('Why 12 trials?');
    for (const secret of ['SECRET-PASSWORD-HASH', full.hash, full.token, 'Rea Feree', full.reportId])
      expect(all).not.toContain(secret);
  });

  it('is for leads of the team alone', () => {
    const { db, team } = full;
    const refused = [
      makeMember(db, team.id, 'experimenter'),
      { ...makeMember(db, makeTeam(db).id, 'lead'), teamId: team.id }
    ];
    for (const actor of refused) {
      expect(exportTeam(db, actor)).toEqual({ ok: false, reason: 'not-allowed' });
      expect(importArchive(db, actor, archive)).toEqual({ ok: false, reason: 'not-allowed' });
      db.delete(membership).where(eq(membership.personId, actor.personId)).run();
    }
  });
});

describe('export, import, export', () => {
  it('gives the same datasets, files and documents to the byte, in a team of another database', async () => {
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    expect(importArchive(db, lead, archive, false, 99)).toEqual({
      ok: true,
      from: 'Team ours',
      datasets: 3,
      reports: 2,
      remarks: 2,
      sweeps: 0
    });
    const [before, after] = [textsOf(archive), textsOf(await archiveOf(db, lead))];
    const same = Object.keys(before).filter((path) => /^(datasets|reports|originals)\//.test(path));
    expect(same).toHaveLength(3 * 3 + 2);
    for (const path of same) expect(after[path], path).toBe(before[path]);
    const kept = (files: typeof before) =>
      (JSON.parse(files['reports.json']) as { links: { revokedAt: null }[] }[]).map((it) => ({
        ...it,
        links: it.links.map((one) => ({ ...one, revokedAt: null }))
      }));
    expect(kept(after)).toEqual(kept(before));
    // Who made what is still told, as text.
    const makers = (files: typeof before) => (JSON.parse(files['team.json']) as { madeBy: object }).madeBy;
    expect(Object.values(makers(before))).toHaveLength(4);
    expect(makers(after)).toEqual(makers(before));
  });

  it('takes people as text, opens no link, and tells the events', async () => {
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    // The same address as the maker's: still nobody is matched.
    db.update(person)
      .set({ email: `${full.lead.personId}@example.org` })
      .where(eq(person.id, lead.personId))
      .run();
    importArchive(db, lead, archive, false, 99);
    expect(
      db
        .select({ by: dataset.createdBy })
        .from(dataset)
        .all()
        .map(({ by }) => by)
    ).toEqual([null, null, null]);
    expect(
      db
        .select({ by: report.createdBy })
        .from(report)
        .all()
        .map(({ by }) => by)
    ).toEqual([null, null]);
    const [closed] = db.select().from(link).all();
    expect(closed).toMatchObject({ label: 'referee 2', revokedAt: 99 });
    expect(closed.tokenHash).not.toBe(full.hash);
    const [question, answer] = db.select().from(remark).all();
    expect(question).toMatchObject({ signedAs: 'A referee', personId: null, linkId: closed.id });
    expect(answer).toMatchObject({ signedAs: 'Ada', threadId: question.id });
    const words = listEvents(db, lead).events.map((it) => it.words);
    expect(words[0]).toBe('Ada Invented imported an archive of “Team ours”: 3 datasets, 2 reports');
    expect(words[1]).toBe('Ada Invented imported report 2 of “Invented chain”');
    expect(words.at(-1)).toBe(
      `Ada Invented imported “Invented chain”, first saved by Ada Invented <${full.lead.personId}@example.org>`
    );
    expect(db.select().from(membership).all()).toHaveLength(1);
    expect(db.$client.pragma('foreign_key_check')).toEqual([]);
  });

  it('is told the second time, and refused unless asked', () => {
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    const elsewhere = makeMember(db, makeTeam(db).id, 'lead');
    importArchive(db, lead, archive, false, 99);
    expect(importArchive(db, lead, archive)).toEqual({ ok: false, reason: 'imported-before', at: 99 });
    expect(db.select().from(dataset).all()).toHaveLength(3);
    expect(importArchive(db, elsewhere, archive).ok).toBe(true);
    expect(importArchive(db, lead, archive, true).ok).toBe(true);
    expect(db.select().from(dataset).all()).toHaveLength(9);
    expect(db.select().from(event).where(eq(event.action, 'team.import')).all()).toHaveLength(3);
  });

  it('keeps a run of zeros that packs a thousand to one, and does not take it for a bomb', async () => {
    const db = freshDatabase();
    const lead = makeMember(db, makeTeam(db).id, 'lead');
    const zeros = '0\n'.repeat(1_500_000);
    makeTrueDataset(db, lead, inventedCounts, { bytes: zeros });
    const other = makeMember(db, makeTeam(db).id, 'lead');
    expect(importArchive(db, other, await archiveOf(db, lead))).toMatchObject({ ok: true, datasets: 1 });
  });

  it('holds a document to its dataset', async () => {
    const { document } = await diagnoseInvented();
    expect(document.data.digest).toBe(JSON.parse(textsOf(archive)['datasets/00001.json']).digest);
  });
});
