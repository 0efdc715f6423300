import { newId } from '$lib/server/db/new-id';
import * as schema from '$lib/server/db/schema';
import { KEPT_ASIDE } from '$lib/server/services/aside/kept-aside';
import { purgeAside } from '$lib/server/services/aside/purge';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { makeLink } from '$lib/server/services/links/make-link';
import { openLink } from '$lib/server/services/links/open-link';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { restoreSweep } from '$lib/server/services/sweeps/restore-sweep';
import { saveSiteMap } from '$lib/server/services/site-maps/save-site-map';
import { eq } from 'drizzle-orm';
import { expect, it } from 'vitest';
import { plainLink } from '../../../../support/links';
import { asked, free, makeQuench, saved, setting } from '../../../../support/sweeps';

/** A sweep with a link that was opened, a map of sites, a device with a version, a webhook with a delivery. */
function full() {
  const there = setting();
  const { db, lead, maker } = there;
  const sweepId = saved(db, maker, asked(makeQuench(db, maker, free, 1)));
  const made = makeLink(db, lead, { sweep: sweepId }, plainLink, 10);
  if (!made.ok) throw new Error(made.reason);
  openLink(db, made.token, null, 20, null, true, 'sweep');
  const map = saveSiteMap(db, lead, {
    fileName: 'sites.csv',
    bytes: new TextEncoder().encode('011\n110\n000\n'),
    name: 'Tuesday',
    options: { geometry: 'chain', alpha: 0.05, seek: 'any' },
    device: 'Marram',
    firmware: '1.2',
    group: null,
    keepsKinks: false
  });
  if (!map.ok) throw new Error(map.reason);
  nameKnownDevices(db);
  const webhookId = newId();
  const { teamId, personId } = lead;
  db.insert(schema.webhook)
    .values({
      ...{ id: webhookId, teamId, name: 'w', url: 'https://example.org/', sealedSecret: 'x', actions: '[]' },
      ...{ lastEvent: 0, createdBy: personId, createdAt: 1 }
    })
    .run();
  db.insert(schema.webhookDelivery)
    .values({
      id: newId(),
      webhookId,
      eventId: 1,
      action: 'sweep.make',
      body: '{}',
      status: 'waiting',
      createdAt: 1
    })
    .run();
  return { ...there, sweepId, token: made.token, mapId: map.id };
}

const TABLES = {
  sweep: schema.sweep,
  link: schema.link,
  linkVisit: schema.linkVisit,
  siteMap: schema.siteMap,
  device: schema.device,
  firmwareVersion: schema.firmwareVersion,
  webhook: schema.webhook,
  webhookDelivery: schema.webhookDelivery,
  dataset: schema.dataset,
  originalFile: schema.originalFile
};
const counted = (db: ReturnType<typeof full>['db']) =>
  Object.fromEntries(
    Object.entries(TABLES).map(([name, table]) => [name, db.select().from(table).all().length])
  );

it('a sweep goes with its links 30 days after it was put aside, and no day before; its datasets stay', () => {
  const { db, lead, sweepId } = full();
  const before = counted(db);
  putSweepAside(db, lead, sweepId, 1000);
  purgeAside(db, 1000 + KEPT_ASIDE - 1);
  expect(counted(db)).toEqual(before);
  purgeAside(db, 1000 + KEPT_ASIDE);
  expect(counted(db)).toMatchObject({ sweep: 0, link: 0, linkVisit: 0, dataset: before.dataset });
  expect(restoreSweep(db, lead, sweepId)).toEqual({ ok: false, reason: 'unknown' });
  const told = db.select().from(schema.event).where(eq(schema.event.action, 'sweep.purge')).all();
  expect(told.map(({ thing }) => thing)).toEqual([sweepId]);
});

it('a team that is deleted takes all of it along, and nothing of another team', () => {
  const { db, lead, stranger } = full();
  const theirs = saved(db, stranger, asked(makeQuench(db, stranger, free, 2)));
  for (const [name, n] of Object.entries(counted(db))) expect(n, name).toBeGreaterThan(0);
  db.delete(schema.team).where(eq(schema.team.id, lead.teamId)).run();
  const left = counted(db);
  expect(left).toMatchObject({ sweep: 1, link: 0, linkVisit: 0, siteMap: 0, webhook: 0, webhookDelivery: 0 });
  expect(db.select().from(schema.sweep).all()[0].id).toBe(theirs);
  expect(left.dataset).toBe(free.length);
});

it('a person who is deleted leaves sweeps and maps to the team, by nobody', () => {
  const { db, maker, sweepId } = full();
  db.delete(schema.person).where(eq(schema.person.id, maker.personId)).run();
  const kept = db.select().from(schema.sweep).where(eq(schema.sweep.id, sweepId)).get();
  expect(kept).toMatchObject({ createdBy: null });
});
