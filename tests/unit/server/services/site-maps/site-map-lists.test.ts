import { event, siteMap } from '$lib/server/db/schema';
import { listAside } from '$lib/server/services/aside/list-aside';
import { purgeAside } from '$lib/server/services/aside/purge';
import { listDevices } from '$lib/server/services/devices/list-devices';
import { listSiteMaps } from '$lib/server/services/site-maps/list-site-maps';
import { openSiteMap } from '$lib/server/services/site-maps/open-site-map';
import { putSiteMapAside } from '$lib/server/services/site-maps/put-site-map-aside';
import { restoreSiteMap } from '$lib/server/services/site-maps/restore-site-map';
import { saveSiteMap } from '$lib/server/services/site-maps/save-site-map';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makeMember, makeTeam } from '../../../../support/people';

const DAY = 86_400_000;

function setting() {
  const db = freshDatabase();
  const team = makeTeam(db);
  const [lead, maker, other, observer] = (['lead', 'experimenter', 'experimenter', 'observer'] as const).map(
    (role) => makeMember(db, team.id, role)
  );
  const stranger = makeMember(db, makeTeam(db).id, 'lead');
  const save = (name: string, now: number, text = '011\n110\n000\n') => {
    const saved = saveSiteMap(
      db,
      maker,
      {
        fileName: `${name}.txt`,
        bytes: new TextEncoder().encode(`# ${name}\n${text}`),
        name,
        options: { geometry: 'chain', alpha: 0.05, seek: 'any' },
        device: 'Marram',
        firmware: '1.2',
        group: null,
        keepsKinks: false
      },
      now
    );
    if (!saved.ok) throw new Error(saved.reason);
    return saved.id;
  };
  return { db, lead, maker, other, observer, stranger, save };
}

describe('maps of sites of a team', () => {
  it('are listed newest first, a page at a time, and not for others', () => {
    const { db, observer, stranger, save } = setting();
    const ids = Array.from({ length: 27 }, (_, i) => save(`map ${i}`, 100 + i));
    const first = listSiteMaps(db, observer, 1);
    expect(first).toMatchObject({ total: 27, page: 1, rows: { length: 25 } });
    expect(first.rows[0]).toMatchObject({
      id: ids[26],
      name: 'map 26',
      sites: 3,
      shots: 3,
      device: 'Marram'
    });
    expect(first.rows[0].statement).toMatch(/pair/);
    expect(listSiteMaps(db, observer, 99)).toMatchObject({ page: 2, rows: [{ id: ids[1] }, { id: ids[0] }] });
    expect(listSiteMaps(db, stranger, 1).total).toBe(0);
    expect(listSiteMaps(db, { ...stranger, teamId: observer.teamId }, 1).total).toBe(0);
    expect(openSiteMap(db, stranger, ids[0])).toEqual({ ok: false, reason: 'unknown' });
  });

  it('name their device and firmware version, as datasets do', () => {
    const { db, observer, save } = setting();
    save('one', 5);
    expect(listDevices(db, observer)).toMatchObject([{ name: 'Marram', newest: '1.2', datasets: 1 }]);
  });

  it('open with document, file and maker; without the document once its bytes were changed', () => {
    const { db, observer, save } = setting();
    const id = save('one', 5);
    const opened = openSiteMap(db, observer, id);
    expect(opened).toMatchObject({
      ok: true,
      map: { name: 'one', fileName: 'one.txt' },
      document: { format: 'severalty.sites/1', shots: 3 }
    });
    db.$client.exec('drop trigger site_map_is_frozen');
    db.update(siteMap).set({ sha256: 'other' }).run();
    expect(openSiteMap(db, observer, id)).toMatchObject({ ok: true, document: null });
  });

  it('are put aside by their maker or a lead, come back, and go for good after 30 days', () => {
    const { db, lead, maker, other, observer, stranger, save } = setting();
    const id = save('one', 5);
    for (const actor of [other, observer, stranger, { ...stranger, teamId: lead.teamId }])
      expect(putSiteMapAside(db, actor, id, 10)).toEqual({ ok: false, reason: 'unknown' });
    expect(putSiteMapAside(db, maker, id, 10)).toEqual({ ok: true, name: 'one' });
    expect(putSiteMapAside(db, maker, id, 11)).toEqual({ ok: false, reason: 'unknown' });
    expect(listSiteMaps(db, lead, 1).total).toBe(0);
    expect(openSiteMap(db, lead, id).ok).toBe(false);
    expect(listAside(db, other, 20)).toMatchObject([
      { id, kind: 'site-map', name: 'Map of sites one', mayRestore: false }
    ]);
    for (const actor of [other, observer, stranger])
      expect(restoreSiteMap(db, actor, id, 12)).toEqual({ ok: false, reason: 'unknown' });
    expect(restoreSiteMap(db, lead, id, 13)).toEqual({ ok: true, name: 'one' });
    expect(listSiteMaps(db, lead, 1).total).toBe(1);
    putSiteMapAside(db, lead, id, 14);
    purgeAside(db, 14 + 29 * DAY);
    expect(db.select().from(siteMap).all()).toHaveLength(1);
    purgeAside(db, 14 + 31 * DAY);
    expect(db.select().from(siteMap).all()).toEqual([]);
    const told = db.select({ action: event.action }).from(event).all();
    expect(told.map(({ action }) => action).filter((action) => action.startsWith('site-map'))).toEqual([
      'site-map.make',
      'site-map.aside',
      'site-map.restore',
      'site-map.aside',
      'site-map.purge'
    ]);
  });
});
