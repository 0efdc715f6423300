import { hashPassword } from '$lib/server/auth/password-hash';
import { event, mailedToken, outboxMessage, person } from '$lib/server/db/schema';
import { mailLink } from '$lib/server/services/accounts/mail-link';
import { findMailedToken } from '$lib/server/services/accounts/mailed-token';
import type { Purpose } from '$lib/server/services/accounts/mailed-purposes';
import { resetPassword } from '$lib/server/services/accounts/reset-password';
import { signInByMail } from '$lib/server/services/accounts/sign-in-by-mail';
import { disablePerson } from '$lib/server/services/people/disable-person';
import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';
import { makePerson } from '../../../../support/people';

let db: ReturnType<typeof freshDatabase>;
let clients = 0;
beforeEach(() => void (db = freshDatabase()));

/** Asks for a link, and gives the token out of the letter (local mode: the outbox). */
async function linkFor(purpose: Purpose, email: string, now: number): Promise<string> {
  const from = { client: `client ${clients++}`, origin: 'http://localhost:1' };
  const mailed = await mailLink(db, { purpose, email, then: '/team/a?b=1&c=2' }, from, now);
  expect(mailed).toEqual({ ok: true });
  const letters = db.select().from(outboxMessage).all();
  const link = new URL(/http\S+token=\S+/.exec(letters[letters.length - 1].text)![0]);
  expect(link.searchParams.get('then')).toBe('/team/a?b=1&c=2');
  db.delete(outboxMessage).run();
  return link.searchParams.get('token')!;
}

const GOOD = 'lighthouse brass verdigris';
const actions = () =>
  db
    .select()
    .from(event)
    .all()
    .map(({ action }) => action);

describe('a link to sign in', () => {
  it('is kept as a hash alone, works once, for a quarter of an hour', async () => {
    const token = await linkFor('sign-in', 'Ada@Example.org', 0);
    expect(token).toMatch(/^[\w-]{43}$/);
    expect(JSON.stringify(db.select().from(mailedToken).all())).not.toContain(token);
    expect(findMailedToken(db, 'sign-in', token, 899_999)).toEqual({ ok: true, email: 'ada@example.org' });
    expect(findMailedToken(db, 'sign-in', token, 900_000)).toEqual({ ok: false, reason: 'expired' });
    expect(signInByMail(db, token, 900_000)).toEqual({ ok: false, reason: 'expired' });
    const used = signInByMail(db, token, 800_000);
    expect(used.ok).toBe(true);
    expect(signInByMail(db, token, 800_001)).toEqual({ ok: false, reason: 'used' });
    expect(db.select().from(person).all()).toEqual([
      expect.objectContaining({ email: 'ada@example.org', name: 'ada', emailVerifiedAt: 800_000 })
    ]);
    expect(actions()).toEqual(['person.add', 'person.sign-in']);
  });

  it('uses up every other one to the same address', async () => {
    const [first, second] = [
      await linkFor('sign-in', 'twice@e.org', 0),
      await linkFor('sign-in', 'twice@e.org', 1)
    ];
    expect(signInByMail(db, second, 2).ok).toBe(true);
    expect(signInByMail(db, first, 3)).toEqual({ ok: false, reason: 'used' });
  });

  it('keeps name and password of somebody known, and lets nobody in whose account is closed', async () => {
    const { id, email, name } = makePerson(db, 'Ada Invented');
    expect(signInByMail(db, await linkFor('sign-in', email, 0), 1)).toEqual({ ok: true, personId: id });
    expect(db.select().from(person).all()).toEqual([expect.objectContaining({ name, emailVerifiedAt: 1 })]);
    const token = await linkFor('sign-in', email, 2);
    disablePerson(db, email);
    expect(signInByMail(db, token, 3)).toEqual({ ok: false, reason: 'disabled' });
  });

  it('is no link for a new password', async () => {
    const { email } = makePerson(db);
    const token = await linkFor('sign-in', email, 0);
    expect(await resetPassword(db, { token, password: GOOD }, 1)).toEqual({ ok: false, reason: 'unknown' });
    expect(signInByMail(db, await linkFor('password', email, 0), 1)).toEqual({
      ok: false,
      reason: 'unknown'
    });
  });
});

describe('a link for a new password', () => {
  it('works for half an hour and is not used up by a weak one', async () => {
    const { id, email } = makePerson(db);
    db.update(person)
      .set({ passwordHash: await hashPassword('old') })
      .run();
    const token = await linkFor('password', email, 0);
    const waiting = await linkFor('sign-in', email, 0);
    expect(await resetPassword(db, { token, password: 'password12' }, 1)).toMatchObject({ reason: 'weak' });
    expect(await resetPassword(db, { token, password: GOOD }, 1_800_000)).toEqual({
      ok: false,
      reason: 'expired'
    });
    const before = db.select().from(person).all()[0];
    // Two at once: one of them.
    const both = await Promise.all([1, 2].map(() => resetPassword(db, { token, password: GOOD }, 1_799_999)));
    expect(both.filter(({ ok }) => ok)).toEqual([{ ok: true, personId: id }]);
    expect(both).toContainEqual({ ok: false, reason: 'used' });
    const after = db.select().from(person).all()[0];
    expect(after.passwordHash).not.toBe(before.passwordHash);
    expect(after.sessionVersion).toBe(before.sessionVersion + 1);
    expect(signInByMail(db, waiting, 2)).toEqual({ ok: false, reason: 'used' });
    expect(actions()).toContain('person.password');
  });

  it('is mailed to nobody without an account: they get a letter that says so', async () => {
    const from = { client: 'stranger', origin: 'http://localhost:1' };
    const asked = { purpose: 'password' as const, email: 'stranger@e.org', then: '/teams' };
    expect(await mailLink(db, asked, from)).toEqual({ ok: true });
    const [letter] = db.select().from(outboxMessage).all();
    expect(letter.to).toBe('stranger@e.org');
    expect(letter.text).toContain('No account has it.');
    expect(db.select().from(mailedToken).all()).toEqual([]);
  });

  it('is refused after five in an hour, known or not', async () => {
    const { email } = makePerson(db);
    for (const address of [email, 'nobody@e.org']) {
      const ask = (i: number) =>
        mailLink(
          db,
          { purpose: 'password', email: address, then: '/' },
          { client: `flood ${address} ${i}`, origin: 'http://localhost:1' }
        );
      for (let i = 0; i < 5; i++) expect((await ask(i)).ok).toBe(true);
      expect(await ask(5)).toMatchObject({ ok: false, reason: 'wait' });
    }
  });
});

it('clears away links that ran out a day ago', async () => {
  await linkFor('sign-in', 'old@e.org', 0);
  await linkFor('sign-in', 'new@e.org', 900_000 + 86_400_001);
  expect(db.select().from(mailedToken).where(eq(mailedToken.email, 'old@e.org')).all()).toEqual([]);
});
