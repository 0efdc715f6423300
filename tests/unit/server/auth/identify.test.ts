import { identify, type Vouched } from '$lib/server/auth/identify';
import { event, identity, person } from '$lib/server/db/schema';
import { disablePerson } from '$lib/server/services/people/disable-person';
import { beforeEach, describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../support/fresh-database';
import { makePerson } from '../../../support/people';

let db: ReturnType<typeof freshDatabase>;
beforeEach(() => void (db = freshDatabase()));

const vouched = (over: Partial<Vouched> = {}): Vouched => ({
  issuer: 'https://id.example.org',
  subject: 'sub-1',
  email: 'nora@example.org',
  emailVerified: true,
  name: 'Nora Invented',
  ...over
});

const count = () => db.select().from(person).all().length;

describe('identify', () => {
  it('makes somebody new of a confirmed address, once', () => {
    const first = identify(db, vouched({ email: 'Nora@Example.org' }), null, 5);
    expect(first.ok).toBe(true);
    expect(db.select().from(person).all()).toEqual([
      expect.objectContaining({ email: 'nora@example.org', name: 'Nora Invented', emailVerifiedAt: 5 })
    ]);
    expect(identify(db, vouched({ email: 'changed@example.org' }), null)).toEqual(first);
    expect(count()).toBe(1);
    expect(
      db
        .select()
        .from(event)
        .all()
        .map(({ action }) => action)
    ).toEqual(['person.add', 'person.identity-tie', 'person.sign-in', 'person.sign-in']);
  });

  it('is another identity at another issuer, and under another subject', () => {
    identify(db, vouched(), null);
    const other = { email: 'other@example.org' };
    identify(db, vouched({ ...other, issuer: 'https://id.example.com' }), null);
    identify(db, vouched({ ...other, subject: 'sub-2' }), null);
    expect(db.select().from(identity).all().length).toBe(3);
    expect(count()).toBe(2);
  });

  it.each([{ emailVerified: false }, { email: null }])(
    'neither finds nor makes anybody by an address that is not confirmed: %j',
    (over) => {
      const { email } = makePerson(db);
      expect(identify(db, vouched({ email, ...over }), null)).toEqual({ ok: false, reason: 'unverified' });
      expect(count()).toBe(1);
      expect(db.select().from(identity).all()).toEqual([]);
    }
  );

  it('ties to who is signed in, address or not, and moves nothing from one account to another', () => {
    const [ada, ben] = [makePerson(db), makePerson(db)];
    expect(identify(db, vouched({ emailVerified: false }), ada.id)).toEqual({ ok: true, personId: ada.id });
    expect(identify(db, vouched(), ben.id)).toEqual({ ok: false, reason: 'other' });
    expect(identify(db, vouched({ email: ben.email }), null)).toEqual({ ok: true, personId: ada.id });
  });

  it('lets nobody in whose account is closed, known or found by address', () => {
    const { email } = makePerson(db);
    identify(db, vouched({ email }), null);
    disablePerson(db, email);
    expect(identify(db, vouched({ email }), null)).toEqual({ ok: false, reason: 'disabled' });
    expect(identify(db, vouched({ email, subject: 'another' }), null)).toEqual({
      ok: false,
      reason: 'disabled'
    });
    expect(db.select().from(identity).all().length).toBe(1);
  });
});
