import { event, link, sweep } from '$lib/server/db/schema';
import { listEvents } from '$lib/server/services/events/list-events';
import { linkVisits } from '$lib/server/services/links/link-visits';
import { listLinks } from '$lib/server/services/links/list-links';
import { makeLink } from '$lib/server/services/links/make-link';
import { openLink } from '$lib/server/services/links/open-link';
import { revokeLink } from '$lib/server/services/links/revoke-link';
import { putSweepAside } from '$lib/server/services/sweeps/put-sweep-aside';
import { readSweep } from '$lib/server/services/sweeps/read-sweep';
import { restoreSweep } from '$lib/server/services/sweeps/restore-sweep';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { linked, plainLink, shared } from '../../../../support/links';
import { asked, free, makeQuench, saved, setting } from '../../../../support/sweeps';

let there: ReturnType<typeof setting>;
let sweepId: string;

beforeEach(() => {
  there = setting();
  const { db, maker } = there;
  sweepId = saved(db, maker, asked(makeQuench(db, maker, free, 1), { name: 'Two decades' }));
});

const open = (token: string, now = 3000, person: { id: string } | null = null, visit?: string | null) =>
  openLink(there.db, token, person, now, visit, true, 'sweep');
const reason = (opened: ReturnType<typeof open>) => (opened.ok ? 'opened' : opened.reason);
const made = (more: Partial<typeof plainLink> = {}) => {
  const link = makeLink(there.db, there.maker, { sweep: sweepId }, { ...plainLink, ...more }, 2000);
  if (!link.ok) throw new Error(link.reason);
  return link;
};

describe('links to a sweep', () => {
  it('are for leads, and for experimenters of their own sweeps', () => {
    const { db, lead, maker, other, observer, stranger } = there;
    const { id } = made();
    const opens = { sweep: sweepId };
    const tried = (actor: typeof lead) => [
      ...new Set(
        [
          makeLink(db, actor, opens, plainLink),
          listLinks(db, actor, opens),
          linkVisits(db, actor, opens, id),
          revokeLink(db, actor, opens, id)
        ].map((answer) => (answer.ok ? 'yes' : answer.reason))
      )
    ];
    expect(tried(stranger)).toEqual(['unknown']);
    expect(tried({ ...stranger, teamId: lead.teamId })).toEqual(['unknown']);
    expect(tried(observer)).toEqual(['not-allowed']);
    expect(tried(other)).toEqual(['not-allowed']);
    expect(tried(maker)).toEqual(['yes']);
    expect(tried(lead)).toEqual(['yes']);
  });

  it('open just that sweep, as its bytes are, and count visits up to their limit', () => {
    const { token, id } = made({ visitLimit: 1 });
    const opened = open(token);
    if (!opened.ok) throw new Error(opened.reason);
    const read = readSweep(there.db, there.lead, sweepId);
    expect(opened.view.document).toBe(read.ok && read.sweep.text);
    expect(opened.view.origin).toMatchObject({ name: 'Two decades', sources: ['Invented ring'] });
    expect(reason(open(token, 3001, null, opened.visit))).toBe('opened');
    expect(reason(open(token, 3001))).toBe('used-up');
    expect(listLinks(there.db, there.lead, { sweep: sweepId }, 3002)).toMatchObject({
      ok: true,
      links: [{ id, visits: 1, refused: 1, state: 'used-up' }]
    });
  });

  it('are closed by revoking, by their end, for others than the named, and while the sweep is put aside', () => {
    const { db, lead, observer } = there;
    const [closed, late, team, any] = [made(), made({ expiresAt: 5000 }), made({ audience: 'team' }), made()];
    revokeLink(db, lead, { sweep: sweepId }, closed.id, 2500);
    expect(reason(open(closed.token))).toBe('revoked');
    expect(reason(open(late.token, 4999))).toBe('opened');
    expect(reason(open(late.token, 5000))).toBe('expired');
    expect(reason(open(team.token))).toBe('sign-in');
    expect(reason(open(team.token, 3000, { id: observer.personId }))).toBe('opened');
    putSweepAside(db, lead, sweepId);
    expect(reason(open(any.token))).toBe('revoked');
    expect(makeLink(db, lead, { sweep: sweepId }, plainLink)).toEqual({ ok: false, reason: 'unknown' });
    restoreSweep(db, lead, sweepId);
    expect(reason(open(any.token))).toBe('opened');
  });

  it('promise neither to keep counts back nor remarks', () => {
    const { db, lead } = there;
    const of = (more: object) => makeLink(db, lead, { sweep: sweepId }, { ...plainLink, ...more });
    expect(of({ shows: 'report' })).toEqual({ ok: false, reason: 'shows-counts' });
    expect(of({ allowsRemarks: true })).toEqual({ ok: false, reason: 'no-remarks' });
    expect(db.select().from(link).all()).toEqual([]);
  });

  it('do not open at the address of a report, nor one to a report at that of a sweep, and nobody came', async () => {
    const { db } = there;
    const { token, id } = made({ visitLimit: 1 });
    expect(openLink(db, token, null, 3000)).toEqual({ ok: false, reason: 'other-kind' });
    expect(linkVisits(db, there.lead, { sweep: sweepId }, id)).toEqual({ ok: true, visits: [] });
    const { lead, reportId } = await shared(db);
    expect(reason(open(linked(db, lead, reportId).token))).toBe('other-kind');
    expect(linkVisits(db, lead, { report: sweepId }, id)).toEqual({ ok: false, reason: 'unknown' });
  });

  it('show nothing of a document whose bytes are damaged', () => {
    const { token } = made();
    const { document } = there.db.select().from(sweep).where(eq(sweep.id, sweepId)).get()!;
    there.db.$client.exec('drop trigger if exists sweep_frozen');
    const triggers = there.db.$client
      .prepare("select name from sqlite_master where type = 'trigger' and tbl_name = 'sweep'")
      .all() as { name: string }[];
    for (const { name } of triggers) there.db.$client.exec(`drop trigger "${name}"`);
    there.db
      .update(sweep)
      .set({ document: document.replace('5000', '5001') })
      .run();
    const opened = open(token);
    expect(opened.ok && opened.view.document).toBeNull();
  });

  it('are named in events with the sweep they open', () => {
    made({ label: 'editor' });
    const { action } = there.db.select().from(event).where(eq(event.action, 'link.make')).get()!;
    expect(action).toBe('link.make');
    const listed = listEvents(there.db, there.lead, { action: 'link.make', page: 1 } as never);
    expect(JSON.stringify(listed)).toContain('the link “editor” to the sweep “Two decades”');
  });
});
