import { linkVisits } from '$lib/server/services/links/link-visits';
import { openLink, VISIT_LASTS } from '$lib/server/services/links/open-link';
import { revokeLink } from '$lib/server/services/links/revoke-link';
import { eq } from 'drizzle-orm';
import { membership, person, report } from '$lib/server/db/schema';
import { beforeEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { linked, SECRETS, shared } from '../../../../support/links';
import { makeMember, makePerson } from '../../../../support/people';

let db: ReturnType<typeof freshDatabase>;
let there: Awaited<ReturnType<typeof shared>>;

beforeEach(async () => {
  db = freshDatabase();
  there = await shared(db);
});

const link = (more: Parameters<typeof linked>[3] = {}) => linked(db, there.lead, there.reportId, more);
const reason = (answer: ReturnType<typeof openLink>) => (answer.ok ? 'opened' : answer.reason);

describe('opening a link', () => {
  it('shows a stranger the report', () => {
    const opened = openLink(db, link().token, null, 3000);
    expect(opened).toMatchObject({ ok: true, view: { origin: { team: SECRETS.team } } });
  });

  it.each(['', 'x', 'a'.repeat(43), `${'a'.repeat(42)}é`, `${'a'.repeat(42)}'`, 'a'.repeat(10_000)])(
    'does not tell the token %s from any other that it does not know',
    (token) => expect(openLink(db, token, null, 3000)).toEqual({ ok: false, reason: 'unknown' })
  );

  it('keeps no token', () => {
    const { token } = link();
    const kept = JSON.stringify([
      db.$client.prepare('select * from link').all(),
      db.$client.prepare('select * from event').all()
    ]);
    expect(kept).toContain('referee 2');
    expect(kept).not.toContain(token);
  });

  it('ends at its expiry, at its revocation, and with its report', () => {
    const late = link({ expiresAt: 5000 });
    expect(reason(openLink(db, late.token, null, 4999))).toBe('opened');
    expect(reason(openLink(db, late.token, null, 5000))).toBe('expired');
    const closed = link();
    revokeLink(db, there.lead, { report: there.reportId }, closed.id, 3000);
    expect(reason(openLink(db, closed.token, null, 3001))).toBe('revoked');
    const gone = link();
    db.update(report).set({ deletedAt: 1 }).where(eq(report.id, there.reportId)).run();
    expect(reason(openLink(db, gone.token, null, 3000))).toBe('revoked');
  });

  it('of named people asks for the address, and that it was shown to be theirs', () => {
    const referee = makePerson(db, 'Referee Two');
    const { token } = link({ audience: 'named', people: [referee.email] });
    expect(reason(openLink(db, token, null, 3000))).toBe('sign-in');
    expect(reason(openLink(db, token, makePerson(db), 3000))).toBe('not-named');
    expect(reason(openLink(db, token, { id: there.lead.personId }, 3000))).toBe('not-named');
    expect(reason(openLink(db, token, referee, 3000))).toBe('opened');
    db.update(person).set({ emailVerifiedAt: null }).where(eq(person.id, referee.id)).run();
    expect(reason(openLink(db, token, referee, 3000))).toBe('not-named');
    db.update(person).set({ emailVerifiedAt: 1, disabledAt: 1 }).where(eq(person.id, referee.id)).run();
    expect(reason(openLink(db, token, referee, 3000))).toBe('not-named');
  });

  it('of the team asks for membership now', () => {
    const observer = makeMember(db, there.teamId, 'observer');
    const { token } = link({ audience: 'team' });
    expect(reason(openLink(db, token, null, 3000))).toBe('sign-in');
    expect(reason(openLink(db, token, makePerson(db), 3000))).toBe('not-in-team');
    expect(reason(openLink(db, token, { id: observer.personId }, 3000))).toBe('opened');
    db.delete(membership).where(eq(membership.personId, observer.personId)).run();
    expect(reason(openLink(db, token, { id: observer.personId }, 3000))).toBe('not-in-team');
  });
});

describe('visits', () => {
  it('are counted once an hour and browser, and the limit lets no more in', () => {
    const { token } = link({ visitLimit: 2 });
    const first = openLink(db, token, null, 3000);
    if (!first.ok) throw new Error('closed');
    for (let i = 1; i < 5; i++) expect(openLink(db, token, null, 3000 + i, first.visit)).toEqual(first);
    expect(reason(openLink(db, token, null, 4000))).toBe('opened');
    expect(reason(openLink(db, token, null, 4001))).toBe('used-up');
    expect(reason(openLink(db, token, null, 3000 + VISIT_LASTS - 1, first.visit))).toBe('opened');
    expect(reason(openLink(db, token, null, 3000 + VISIT_LASTS, first.visit))).toBe('used-up');
  });

  it('of another link, or a refused one, open nothing', () => {
    const other = openLink(db, link().token, null, 3000);
    const { token } = link({ visitLimit: 1 });
    openLink(db, token, null, 3000);
    if (!other.ok) throw new Error('closed');
    expect(reason(openLink(db, token, null, 3001, other.visit))).toBe('used-up');
    const refused = db.$client.prepare(`select id from link_visit where outcome = 'refused'`).get() as {
      id: string;
    };
    expect(reason(openLink(db, token, null, 3002, refused.id))).toBe('used-up');
  });

  it('are not counted of a request that is shown nothing, nor are its refusals', () => {
    const { id, token } = link({ visitLimit: 1 });
    const looked = openLink(db, token, null, 3000, undefined, false);
    expect(looked).toMatchObject({ ok: true, visit: null });
    expect(reason(openLink(db, token, null, 3001))).toBe('opened');
    expect(reason(openLink(db, token, null, 3002, undefined, false))).toBe('used-up');
    expect(linkVisits(db, there.lead, { report: there.reportId }, id)).toMatchObject({
      visits: [{ at: 3001, outcome: 'opened' }]
    });
  });

  it('do not outlive a revocation', () => {
    const { id, token } = link();
    const first = openLink(db, token, null, 3000);
    revokeLink(db, there.lead, { report: there.reportId }, id, 3001);
    expect(reason(openLink(db, token, null, 3002, first.ok ? first.visit : ''))).toBe('revoked');
  });

  it('that are refused are logged, once a minute', () => {
    const { id, token } = link({ expiresAt: 2500 });
    for (let i = 0; i < 50; i++) openLink(db, token, null, 3000 + i);
    openLink(db, token, null, 70_000);
    expect(linkVisits(db, there.lead, { report: there.reportId }, id)).toEqual({
      ok: true,
      visits: [
        { at: 70_000, who: null, outcome: 'refused' },
        { at: 3000, who: null, outcome: 'refused' }
      ]
    });
  });

  it('name who came, unless the link hides its referees', () => {
    const referee = makePerson(db, 'Referee Two');
    const seen = (hidesReferees: boolean) => {
      const { id, token } = link({ audience: 'named', people: [referee.email], hidesReferees });
      openLink(db, token, referee, 86_400_000 * 3 + 5);
      return linkVisits(db, there.lead, { report: there.reportId }, id);
    };
    expect(seen(false)).toMatchObject({ visits: [{ at: 86_400_000 * 3 + 5, who: 'Referee Two' }] });
    expect(seen(true)).toMatchObject({ visits: [{ at: 86_400_000 * 3, who: null }] });
  });
});
