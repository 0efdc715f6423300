import { newToken } from '$lib/server/auth/new-token';
import { newId } from '$lib/server/db/new-id';
import {
  dataset,
  firmwareVersion,
  invitation,
  job,
  mailedToken,
  person,
  report,
  siteMap,
  sweep,
  team
} from '$lib/server/db/schema';
import { DEMO_PEOPLE, DEMO_TEAM } from '$lib/server/services/demo-team/demo-people';
import { nameKnownDevices } from '$lib/server/services/devices/name-known-devices';
import { makeLink } from '$lib/server/services/links/make-link';
import { saveReport } from '$lib/server/services/reports/save-report';
import { asc, eq, inArray } from 'drizzle-orm';
import { diagnoseNine, plainLink } from '../../support/links';
import { hookOf } from '../../support/webhooks';
import { unsubscribing } from './unsubscribing';
import { withDatabaseOf } from './seed-people';
import type { RunningServer } from './start-server';

const DAY = 86_400_000;

/** Waits until every diagnosis that the invented team begins with has ended. */
export async function demoIsReady(server: RunningServer, patience: number): Promise<void> {
  const late = Date.now() + patience;
  for (;;) {
    const [left, all] = await withDatabaseOf(server, (db) => [
      db
        .select({ id: job.id })
        .from(job)
        .where(inArray(job.status, ['queued', 'running']))
        .all().length,
      db.select({ id: job.id }).from(job).all().length
    ]);
    if (all > 0 && left === 0) return;
    if (Date.now() > late)
      throw new Error(`${left} of ${all} diagnoses of the invented team are still open.`);
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
}

/**
 * An address for every page of the application, by its folder in src/routes, on a server with the invented team; some
 * have two. What a page needs is made: a link, an invitation, a mailed token.
 */
export async function demoAddresses(server: RunningServer): Promise<Record<string, string[]>> {
  const { document, options } = await diagnoseNine();
  return withDatabaseOf(server, (db) => {
    const now = Date.now();
    const ours = db.select().from(team).where(eq(team.slug, DEMO_TEAM.slug)).get()!;
    const lead = db.select().from(person).where(eq(person.email, DEMO_PEOPLE[0].email)).get()!;
    const reports = db
      .select({ id: report.id, datasetId: report.datasetId, name: dataset.name })
      .from(report)
      .innerJoin(dataset, eq(dataset.id, report.datasetId))
      .where(eq(report.teamId, ours.id))
      .orderBy(asc(dataset.name))
      .all();
    const bunched = reports.find(({ name }) => /bunch/i.test(name)) ?? reports[0];
    const swept = db.select({ id: sweep.id }).from(sweep).where(eq(sweep.teamId, ours.id)).get()!;
    const [before, mapped] = db
      .select({ id: siteMap.id })
      .from(siteMap)
      .where(eq(siteMap.teamId, ours.id))
      .orderBy(asc(siteMap.createdAt))
      .all();
    const { datasetId } = bunched;
    const second = db.transaction((tx) =>
      saveReport(tx, { teamId: ours.id, datasetId, createdBy: lead.id, document, options })
    );
    // A device that the demo has none of: a diagnosed dataset and one that is not, under two versions.
    const onDevice = { device: 'Marram chain (invented)', firmware: 'ebb 3.1' };
    db.update(dataset).set(onDevice).where(eq(dataset.id, datasetId)).run();
    db.update(dataset)
      .set({ ...onDevice, firmware: 'ebb 3.2', group: 'north bank' })
      .where(eq(dataset.id, reports.find((other) => other.datasetId !== datasetId)!.datasetId))
      .run();
    nameKnownDevices(db);
    const chain = db.select().from(firmwareVersion).where(eq(firmwareVersion.name, 'ebb 3.1')).get()!;
    const actor = { personId: lead.id, teamId: ours.id, role: 'lead' as const };
    const shared = (more: Partial<typeof plainLink>) => {
      const made = makeLink(db, actor, { report: bunched.id }, { ...plainLink, ...more }, now);
      if (!made.ok) throw new Error(made.reason);
      return `/link/${made.token}`;
    };
    const sharedSweep = (blind: boolean) => {
      const made = makeLink(db, actor, { sweep: swept.id }, { ...plainLink, blind }, now);
      if (!made.ok) throw new Error(made.reason);
      return `/link/${made.token}/sweep`;
    };
    const invited = newToken();
    db.insert(invitation)
      .values({
        id: newId(),
        teamId: ours.id,
        email: 'new@wrackline.example',
        role: 'observer',
        tokenHash: invited.hash,
        invitedBy: lead.id,
        createdAt: now,
        expiresAt: now + DAY
      })
      .run();
    const mailed = (purpose: 'sign-in' | 'password') => {
      const { token, hash } = newToken();
      db.insert(mailedToken)
        .values({
          id: newId(),
          tokenHash: hash,
          purpose,
          email: lead.email,
          createdAt: now,
          expiresAt: now + DAY
        })
        .run();
      return token;
    };
    const root = `/team/${DEMO_TEAM.slug}`;
    return {
      '': [
        '/',
        '/#counts=0:185,1:1149,2:3265,3:5475,4:6114,5:5194,6:3067,7:1331,8:403,9:105,10:14,11:4&trials=12&sum=26306'
      ],
      '/cumulants': [
        '/cumulants',
        '/cumulants#mean=4&mean-error=0.05&variance=4.9&variance-error=0.1&third=7&third-error=0.6&trials=64'
      ],
      '/plan': ['/plan', '/plan#find=misread&mean=4&trials=50&size=0.01&shots=5000&most=0'],
      '/guide': ['/guide'],
      '/guide/terms': ['/guide/terms'],
      '/api': ['/api'],
      '/(account)/teams': ['/teams'],
      '/(account)/account': ['/account'],
      '/(account)/account/mail': ['/account/mail'],
      '/unsubscribe/[token]': unsubscribing(db, server, actor),
      '/(account)/sign-in': ['/sign-in'],
      '/(account)/sign-in/by-mail': ['/sign-in/by-mail'],
      '/(account)/sign-in/mailed': [`/sign-in/mailed?token=${mailed('sign-in')}`, '/sign-in/mailed?token=no'],
      '/(account)/password': ['/password'],
      '/(account)/password/new': [`/password/new?token=${mailed('password')}`, '/password/new?token=no'],
      '/(account)/outbox': ['/outbox'],
      '/(team)/team/[team=slug]': [root],
      '/(team)/team/[team=slug]/jobs': [`${root}/jobs`],
      '/(team)/team/[team=slug]/events': [`${root}/events`],
      '/(team)/team/[team=slug]/datasets': [`${root}/datasets`, `${root}/datasets?q=nothing-is-called-so`],
      '/(team)/team/[team=slug]/datasets/new': [`${root}/datasets/new`],
      '/(team)/team/[team=slug]/datasets/edit': [`${root}/datasets/edit?dataset=${bunched.datasetId}`],
      '/(team)/team/[team=slug]/datasets/[id]': [`${root}/datasets/${bunched.datasetId}`],
      '/(team)/team/[team=slug]/reports': [`${root}/reports`],
      '/(team)/team/[team=slug]/reports/[id]': [`${root}/reports/${bunched.id}`],
      '/(team)/team/[team=slug]/reports/compare': [`${root}/reports/compare?a=${bunched.id}&b=${second.id}`],
      '/(team)/team/[team=slug]/devices': [`${root}/devices`],
      '/(team)/team/[team=slug]/devices/[id]': [`${root}/devices/${chain.deviceId}`],
      '/(team)/team/[team=slug]/devices/[id]/timeline': [`${root}/devices/${chain.deviceId}/timeline`],
      '/(team)/team/[team=slug]/devices/[id]/pairs': [
        `${root}/devices/${chain.deviceId}/pairs`,
        `${root}/devices/${chain.deviceId}/pairs?version=${chain.id}`
      ],
      '/(team)/team/[team=slug]/devices/[id]/versions/[version]': [
        `${root}/devices/${chain.deviceId}/versions/${chain.id}`
      ],
      '/(team)/team/[team=slug]/sweeps': [`${root}/sweeps`],
      '/(team)/team/[team=slug]/sweeps/new': [`${root}/sweeps/new`, `${root}/sweeps/new?axis=hold-time`],
      '/(team)/team/[team=slug]/sweeps/[id]': [
        `${root}/sweeps/${swept.id}`,
        `${root}/sweeps/${swept.id}?from=2&to=16`
      ],
      '/(team)/team/[team=slug]/sites': [`${root}/sites`],
      '/(team)/team/[team=slug]/sites/new': [`${root}/sites/new`],
      '/(team)/team/[team=slug]/sites/compare': [
        `${root}/sites/compare?a=${before.id}&b=${mapped.id}`,
        `${root}/sites/compare?a=${mapped.id}&b=${mapped.id}`
      ],
      '/(team)/team/[team=slug]/sites/[id]': [`${root}/sites/${mapped.id}`],
      '/(team)/team/[team=slug]/settings': [`${root}/settings`],
      '/(team)/team/[team=slug]/scripts': [`${root}/scripts`],
      '/(team)/team/[team=slug]/webhooks': [`${root}/webhooks`],
      '/(team)/team/[team=slug]/webhooks/[id]': [`${root}/webhooks/${hookOf(db, actor)}`],
      '/(team)/team/[team=slug]/members': [`${root}/members`],
      '/(team)/team/[team=slug]/leave': [`${root}/leave`],
      '/(team)/team/[team=slug]/aside': [`${root}/aside`],
      '/invitation/[token]': [`/invitation/${invited.token}`, '/invitation/no'],
      '/link/[token]': [shared({ allowsRemarks: true }), shared({ blind: true, shows: 'report' })],
      '/link/[token]/sweep': [sharedSweep(false), sharedSweep(true)]
    };
  });
}
