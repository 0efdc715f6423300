import { makePerson } from '$lib/server/auth/make-person';
import { sessionPerson } from '$lib/server/auth/session-person';
import { event, person } from '$lib/server/db/schema';
import { account } from '$lib/server/services/accounts/account';
import { changePassword } from '$lib/server/services/accounts/change-password';
import { checkPassword } from '$lib/server/services/accounts/check-password';
import { disablePerson } from '$lib/server/services/people/disable-person';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';

let numbers = 0;

async function somebody() {
  const db = freshDatabase();
  const made = await makePerson(db, { email: `p${numbers++}@e.org`, name: 'Ada', password: 'the old one' });
  if (!made.ok) throw new Error(made.reason);
  return { db, ...made.person, client: `client ${numbers}` };
}

const NEW = 'lighthouse brass verdigris';

describe('checkPassword', () => {
  it('knows the person by address, in whatever case, and password', async () => {
    const { db, id, email, client } = await somebody();
    const check = (typed: string, password: string) => checkPassword(db, { email: typed, password }, client);
    expect(await check(` ${email.toUpperCase()} `, 'the old one')).toEqual({ ok: true, personId: id });
    expect(await check(email, 'The old one')).toEqual({ ok: false, reason: 'wrong' });
    expect(await check('nobody@e.org', 'the old one')).toEqual({ ok: false, reason: 'wrong' });
    const events = db.select().from(event).all();
    expect(events.map(({ action }) => action)).toEqual(['person.sign-in', 'person.sign-in-failed']);
    expect(JSON.stringify(events)).not.toMatch(/e\.org|old one/);
  });

  it('says of a closed account what it says of none, and of somebody without a password', async () => {
    const { db, email, client } = await somebody();
    disablePerson(db, email);
    expect(await checkPassword(db, { email, password: 'the old one' }, client)).toEqual({
      ok: false,
      reason: 'wrong'
    });
    const bare = await makePerson(db, { email: 'bare@e.org', name: 'Bare' });
    expect(bare.ok).toBe(true);
    for (const password of ['', 'x'])
      expect(await checkPassword(db, { email: 'bare@e.org', password }, client)).toEqual({
        ok: false,
        reason: 'wrong'
      });
  });

  it('holds up the right password too, once there were ten wrong ones', async () => {
    const { db, email, client } = await somebody();
    for (let i = 0; i < 10; i++) await checkPassword(db, { email, password: 'wrong' }, client);
    expect(await checkPassword(db, { email, password: 'the old one' }, client)).toMatchObject({
      ok: false,
      reason: 'wait'
    });
  });
});

describe('changePassword', () => {
  it('takes the old one and a good new one, and ends every session', async () => {
    const { db, id, email, client } = await somebody();
    const change = (old: string, password: string) => changePassword(db, id, { old, password }, client);
    expect(await change('wrong', NEW)).toEqual({ ok: false, reason: 'wrong' });
    expect(await change('the old one', 'the old one 1')).toMatchObject({ ok: false, reason: 'weak' });
    expect(sessionPerson(db, id, 0)).not.toBeNull();
    expect(await change('the old one', NEW)).toEqual({ ok: true });
    expect(sessionPerson(db, id, 0)).toBeNull();
    expect((await checkPassword(db, { email, password: NEW }, client)).ok).toBe(true);
  });

  it('is not for somebody who has none: they choose one by mail', async () => {
    const { db, id, client } = await somebody();
    db.update(person).set({ passwordHash: null }).run();
    expect(account(db, id)?.hasPassword).toBe(false);
    expect(await changePassword(db, id, { old: '', password: NEW }, client)).toEqual({
      ok: false,
      reason: 'wrong'
    });
  });
});
