import { makePerson } from '$lib/server/auth/make-person';
import { sessionPerson, sessionVersion } from '$lib/server/auth/session-person';
import { person } from '$lib/server/db/schema';
import { signOutEverywhere } from '$lib/server/services/accounts/change-account';
import { disablePerson, enablePerson } from '$lib/server/services/people/disable-person';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';

async function somebody() {
  const db = freshDatabase();
  const made = await makePerson(db, { email: ' Ada@Example.org ', name: 'Ada', password: 'x' });
  if (!made.ok) throw new Error(made.reason);
  return { db, ...made.person };
}

describe('makePerson', () => {
  it('keeps addresses in lower case, and no second person of one', async () => {
    const { db, email } = await somebody();
    expect(email).toBe('ada@example.org');
    expect(await makePerson(db, { email: 'ADA@example.org', name: 'Other' })).toEqual({
      ok: false,
      reason: 'taken'
    });
    expect(db.select().from(person).all()[0].passwordHash).toMatch(/^\$argon2id/);
  });
});

describe('a session', () => {
  it('gives id, address and name of its person, and nothing else', async () => {
    const { db, id } = await somebody();
    expect(sessionPerson(db, id, 0)).toEqual({ id, email: 'ada@example.org', name: 'Ada' });
    expect(sessionPerson(db, 'unknown', 0)).toBeNull();
    expect(sessionPerson(db, id, Number.NaN)).toBeNull();
  });

  it('ends with disabling, and stays ended when the account is opened again', async () => {
    const { db, id, email } = await somebody();
    expect(disablePerson(db, email)).toEqual({ ok: true, changed: true });
    expect(sessionPerson(db, id, 0)).toBeNull();
    expect(sessionPerson(db, id, 1)).toBeNull();
    expect(sessionVersion(db, id)).toBeNull();
    enablePerson(db, email);
    expect(sessionPerson(db, id, 0)).toBeNull();
    expect(sessionVersion(db, id)).toBe(2);
  });

  it('ends with signing out everywhere', async () => {
    const { db, id } = await somebody();
    signOutEverywhere(db, id);
    expect(sessionPerson(db, id, 0)).toBeNull();
    expect(sessionPerson(db, id, 1)).not.toBeNull();
  });
});
