import { listLinks } from '$lib/server/services/links/list-links';
import { linkVisits } from '$lib/server/services/links/link-visits';
import { mailLink, type LinkLetter } from '$lib/server/services/links/mail-link';
import { makeLink } from '$lib/server/services/links/make-link';
import { openLink } from '$lib/server/services/links/open-link';
import { revokeLink } from '$lib/server/services/links/revoke-link';
import { report } from '$lib/server/db/schema';
import { saveReport } from '$lib/server/services/reports/save-report';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { linked, plainLink, SECRETS, shared } from '../../../../support/links';
import { makeMember, makeTeam } from '../../../../support/people';
import { diagnoseInvented, makeDataset } from '../../../../support/saved-reports';

let db: ReturnType<typeof freshDatabase>;
let there: Awaited<ReturnType<typeof shared>>;

beforeEach(async () => {
  db = freshDatabase();
  there = await shared(db);
});

describe('making and revoking links', () => {
  it('is for leads, and for experimenters of their own reports', async () => {
    const own = makeMember(db, there.teamId, 'experimenter');
    const other = makeMember(db, there.teamId, 'experimenter');
    const observer = makeMember(db, there.teamId, 'observer');
    const stranger = makeMember(db, makeTeam(db).id, 'lead');
    const datasetId = makeDataset(db, there.teamId);
    const made = await diagnoseInvented();
    const { id } = db.transaction((tx) =>
      saveReport(tx, { teamId: there.teamId, datasetId, createdBy: own.personId, ...made })
    );
    const link = linked(db, there.lead, id);
    const tried = (actor: typeof own) => {
      const refusals = [
        makeLink(db, actor, { report: id }, plainLink),
        listLinks(db, actor, { report: id }),
        linkVisits(db, actor, { report: id }, link.id),
        revokeLink(db, actor, { report: id }, link.id)
      ].map((answer) => (answer.ok ? 'yes' : answer.reason));
      return [...new Set(refusals)];
    };
    expect(tried(stranger)).toEqual(['unknown']);
    expect(tried(observer)).toEqual(['not-allowed']);
    expect(tried(other)).toEqual(['not-allowed']);
    expect(tried({ ...stranger, teamId: there.teamId })).toEqual(['unknown']);
    expect(tried(own)).toEqual(['yes']);
    expect(tried(there.lead)).toEqual(['yes']);
  });

  it('does not find links of another report', async () => {
    const { id } = linked(db, there.lead, there.reportId);
    const datasetId = makeDataset(db, there.teamId);
    const made = await diagnoseInvented();
    const second = db.transaction((tx) =>
      saveReport(tx, { teamId: there.teamId, datasetId, createdBy: null, ...made })
    );
    expect(revokeLink(db, there.lead, { report: second.id }, id)).toEqual({ ok: false, reason: 'unknown' });
    expect(linkVisits(db, there.lead, { report: second.id }, id)).toEqual({ ok: false, reason: 'unknown' });
  });

  it('refuses an end in the past, and to hide what cannot be hidden', async () => {
    const past = makeLink(db, there.lead, { report: there.reportId }, { ...plainLink, expiresAt: 5 }, 5);
    expect(past).toEqual({ ok: false, reason: 'past' });
    const datasetId = makeDataset(db, there.teamId);
    const made = await diagnoseInvented();
    const three = db.transaction((tx) =>
      saveReport(tx, { teamId: there.teamId, datasetId, createdBy: null, ...made })
    );
    expect(makeLink(db, there.lead, { report: three.id }, { ...plainLink, shows: 'report' })).toEqual({
      ok: false,
      reason: 'too-few-counts'
    });
  });

  it('lists state and visits, newest first, and keeps people of named links alone', () => {
    linked(db, there.lead, there.reportId, { people: ['a@example.org'], visitLimit: 1 }, 2000);
    const named = linked(
      db,
      there.lead,
      there.reportId,
      { audience: 'named', people: ['b@example.org'], label: 'later' },
      2001
    );
    const open = linked(db, there.lead, there.reportId, { visitLimit: 1 }, 2002);
    openLink(db, open.token, null, 3000);
    openLink(db, open.token, null, 3001);
    revokeLink(db, there.lead, { report: there.reportId }, named.id, 3002);
    revokeLink(db, there.lead, { report: there.reportId }, named.id, 3003);
    const listed = listLinks(db, there.lead, { report: there.reportId }, 4000);
    expect(listed).toMatchObject({
      links: [
        { id: open.id, state: 'used-up', visits: 1, refused: 1, lastVisitAt: 3000 },
        { id: named.id, state: 'revoked', revokedAt: 3002, people: ['b@example.org'], visits: 0 },
        { state: 'open', people: [], lastVisitAt: null }
      ]
    });
    expect(JSON.stringify(listed)).not.toContain('oken');
    const events = db.$client.prepare(`select action from event where action like 'link.%'`).all();
    expect(events).toHaveLength(4);
  });

  it('lists the last visit to the day where the link hides its referees', () => {
    const day = 86_400_000;
    const hiding = linked(db, there.lead, there.reportId, { hidesReferees: true }, 2000);
    const telling = linked(db, there.lead, there.reportId, {}, 2001);
    for (const { token } of [hiding, telling]) openLink(db, token, null, 3 * day + 5678);
    const listed = listLinks(db, there.lead, { report: there.reportId }, 4 * day);
    expect(listed.ok && listed.links.map(({ id, lastVisitAt }) => [id, lastVisitAt])).toEqual([
      [telling.id, 3 * day + 5678],
      [hiding.id, 3 * day]
    ]);
  });

  it('is over for a report that was put aside', () => {
    db.update(report).set({ deletedAt: 1 }).where(eq(report.id, there.reportId)).run();
    expect(makeLink(db, there.lead, { report: there.reportId }, plainLink)).toEqual({
      ok: false,
      reason: 'unknown'
    });
  });
});

describe('mail to named people', () => {
  const letter: LinkLetter = {
    address: 'https://example.org/link/TOKEN',
    people: ['a@example.org', 'b@example.org'],
    opens: 'report',
    blind: true,
    allowsRemarks: true,
    expiresAt: Date.UTC(2031, 4, 6, 12),
    visitLimit: 3,
    team: SECRETS.team,
    from: 'Ibexia'
  };

  it('goes to each alone, and tells who could not be reached', async () => {
    const sent: { to: string; subject: string; text: string }[] = [];
    const missed = await mailLink(db, letter, async (_db, message) => {
      sent.push(message);
      return message.to === 'a@example.org' ? { ok: true } : { ok: false, reason: 'not-sent' };
    });
    expect(missed).toEqual(['b@example.org']);
    expect(sent.map(({ to }) => to)).toEqual(letter.people);
    for (const { to, text } of sent) {
      expect(letter.people.filter((other) => other !== to && text.includes(other))).toEqual([]);
      expect(text).toContain(letter.address);
      expect(text).toMatch(/open until 6 May 2031, 12:00 UTC\.[\s\S]*3 times in all/);
    }
  });

  it('names team and sender unless the link is blind', async () => {
    const written = async (blind: boolean) => {
      let all = '';
      await mailLink(db, { ...letter, blind }, async (_db, message) => {
        all += JSON.stringify(message);
        return { ok: true };
      });
      return all;
    };
    expect(await written(false)).toMatch(/Quaggalab/);
    expect(await written(true)).not.toMatch(/Quaggalab|Ibexia/);
  });
});
