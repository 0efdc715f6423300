import { oneCrosstalkingPair } from '$lib/stats/demo/one-crosstalking-pair';
import { dataset, originalFile, siteMap } from '$lib/server/db/schema';
import { purgeAside } from '$lib/server/services/aside/purge';
import { pageOfSiteMaps } from '$lib/server/services/site-maps/page-of-site-maps';
import { readSiteMap } from '$lib/server/services/site-maps/read-site-map';
import { saveSiteMap } from '$lib/server/services/site-maps/save-site-map';
import type { SiteMapRequest } from '$lib/server/services/site-maps/site-map-request';
import type { SitesReport } from '$lib/stats/sites/sites-types';
import { eq, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const DAY = 86_400_000;

const request = (text: string, more: Partial<SiteMapRequest> = {}): SiteMapRequest => ({
  fileName: 'sites.csv',
  bytes: new TextEncoder().encode(text),
  name: 'Tuesday',
  options: { geometry: 'chain', alpha: 0.05, seek: 'rise' },
  device: 'Marram',
  firmware: '1.2',
  group: 'left',
  keepsKinks: true,
  ...more
});

function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const [maker, observer] = (['experimenter', 'observer'] as const).map((role) =>
    makeMember(db, team.id, role)
  );
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const rows = () =>
    [originalFile, siteMap, dataset].map(
      (table) =>
        db
          .select({ n: sql<number>`count(*)` })
          .from(table)
          .get()!.n
    );
  return { db, maker, observer, stranger, rows };
}

describe('a saved map of sites', () => {
  it('has its document, and counts and kinks of the same shots as datasets of the same device', () => {
    const { db, maker, observer } = setting();
    const saved = saveSiteMap(db, maker, request('a,b,c\n0,1,1\n1,0,1\n0,0,0\n'), 5);
    if (!saved.ok) throw new Error(saved.reason);
    const read = readSiteMap(db, observer, saved.id);
    if (!read.ok) throw new Error(read.reason);
    const document = JSON.parse(read.text) as SitesReport;
    expect(document).toMatchObject({ format: 'severalty.sites/1', names: ['a', 'b', 'c'], shots: 3 });
    expect(read.map).toMatchObject({ device: 'Marram', seek: 'rise', statement: document.statement });
    const counts = (id: string | null) => db.select().from(dataset).where(eq(dataset.id, id!)).get()!;
    const [excited, kinks] = [counts(read.map.countsDataset), counts(read.map.kinksDataset)];
    // 011, 101 and 000, by hand.
    expect(JSON.parse(excited.counts)).toMatchObject({ kind: 'shots', shots: [2, 2, 0] });
    expect(JSON.parse(kinks.counts)).toMatchObject({ kind: 'shots', shots: [1, 2, 0] });
    expect(excited).toMatchObject({
      trials: 3,
      geometry: 'sites',
      device: 'Marram',
      firmware: '1.2',
      group: 'left'
    });
    expect(kinks).toMatchObject({ trials: 2, geometry: 'open-bonds' });
    expect(pageOfSiteMaps(db, observer, { limit: 5, device: 'Marram' })).toMatchObject({
      page: { entries: [{ id: saved.id }], next: null }
    });
    expect(pageOfSiteMaps(db, observer, { limit: 5, device: 'other' })).toMatchObject({
      page: { entries: [] }
    });
  });

  it('finds the one invented pair of 64 sites, and says that counts alone cannot', () => {
    const { db, maker } = setting();
    const saved = saveSiteMap(db, maker, request(oneCrosstalkingPair()));
    const read = readSiteMap(db, maker, saved.ok ? saved.id : '');
    if (!read.ok) throw new Error(read.reason);
    expect(read.map.statement).toMatch(/^One pair of .* sites 21 and 22/);
    expect(read.text).toContain('The count histogram alone cannot show this pair.');
  });

  it('is there once: the same bytes again are refused and named, another geometry is another map', () => {
    const { db, maker, rows } = setting();
    const first = saveSiteMap(db, maker, request('011\n110\n'));
    const again = saveSiteMap(db, maker, request('011\n110\n', { name: 'again' }));
    expect(again).toMatchObject({
      reason: 'already-there',
      already: [{ id: first.ok && first.id, name: 'Tuesday' }]
    });
    expect(rows()).toEqual([1, 1, 2]);
    const ring = { geometry: 'ring', alpha: 0.05, seek: 'rise' } as const;
    expect(saveSiteMap(db, maker, request('011\n110\n', { options: ring })).ok).toBe(true);
    expect(rows()).toEqual([1, 2, 4]);
  });

  it.each([
    ['01\n0x\n', { problems: [{ line: 2, column: 2 }] }],
    ['01\n011\n', { problems: [{ line: 2 }] }],
    ['', { reason: 'empty' }],
    ['01\n', { problems: [{ message: 'A map of sites takes two shots or more.' }] }],
    [
      `${'0'.repeat(129)}\n${'1'.repeat(129)}\n`,
      { problems: [{ message: expect.stringContaining('128 at most') }] }
    ],
    ['01\n'.repeat(1_500_000), { reason: 'too-large' }]
  ])('is refused with its place, and nothing is kept', (text, why) => {
    const { db, maker, rows } = setting();
    expect(saveSiteMap(db, maker, request(text))).toMatchObject({ ok: false, ...why });
    expect(rows()).toEqual([0, 0, 0]);
  });

  it('is made by who may upload, and not there for another team', () => {
    const { db, maker, observer, stranger, rows } = setting();
    expect(saveSiteMap(db, observer, request('01\n10\n'))).toEqual({ ok: false, reason: 'not-allowed' });
    expect(saveSiteMap(db, { ...stranger, teamId: maker.teamId }, request('01\n10\n'))).toMatchObject({
      ok: false
    });
    expect(rows()).toEqual([0, 0, 0]);
    const saved = saveSiteMap(db, maker, request('01\n10\n'));
    const id = saved.ok ? saved.id : '';
    expect(readSiteMap(db, stranger, id)).toEqual({ ok: false, reason: 'unknown' });
    expect(readSiteMap(db, { ...stranger, teamId: maker.teamId }, id)).toEqual({
      ok: false,
      reason: 'unknown'
    });
    expect(pageOfSiteMaps(db, stranger, { limit: 5 })).toMatchObject({ page: { entries: [] } });
  });

  it('keeps its file when its datasets are removed for good, and can be read', () => {
    const { db, maker, rows } = setting();
    const saved = saveSiteMap(db, maker, request('01\n10\n'), 1);
    db.update(dataset).set({ deletedAt: 2 }).run();
    purgeAside(db, 40 * DAY);
    expect(rows()).toEqual([1, 1, 0]);
    const read = readSiteMap(db, maker, saved.ok ? saved.id : '');
    expect(read).toMatchObject({ ok: true, map: { countsDataset: null, kinksDataset: null } });
  });
});
