import { isLocal, readEnv } from '$lib/server/env';
import { outbox } from '$lib/server/services/accounts/outbox';
import { waysIn } from '$lib/server/services/accounts/ways-in';
import { describe, expect, it } from 'vitest';
import { freshDatabase } from '../../../../support/fresh-database';

const OIDC = { OIDC_ISSUER: 'https://id.example.org', OIDC_CLIENT_ID: 'a', OIDC_CLIENT_SECRET: 'b' };

describe('local mode', () => {
  it.each([
    [{}, true],
    [{ HOST: '::1', ORIGIN: 'http://localhost:4173' }, true],
    [{ HOST: '127.0.0.53', ORIGIN: 'http://[::1]:1' }, true],
    [{ HOST: '0.0.0.0' }, false],
    [{ HOST: '127.0.0.1.example.org' }, false],
    [{ SMTP_URL: 'smtp://localhost' }, false],
    [{ ORIGIN: 'https://counts.example.org' }, false],
    [{ ADDRESS_HEADER: 'x-forwarded-for' }, false]
  ])('with %j: %s', (given, local) => expect(isLocal(readEnv(given))).toBe(local));
});

describe('the outbox', () => {
  it('is open to this machine alone, in local mode alone', () => {
    const db = freshDatabase();
    expect(outbox(db, '127.0.0.1', readEnv({}))).toEqual([]);
    expect(outbox(db, '0:0:0:0::/64', readEnv({}))).toEqual([]);
    expect(outbox(db, '192.0.2.7', readEnv({}))).toBeNull();
    expect(outbox(db, 'unknown', readEnv({}))).toBeNull();
    expect(outbox(db, '127.0.0.1', readEnv({ HOST: '0.0.0.0' }))).toBeNull();
  });
});

describe('the ways in', () => {
  it('are told from the settings', () => {
    expect(waysIn(readEnv({}))).toEqual({ mail: true, issuer: null });
    expect(waysIn(readEnv({ HOST: '0.0.0.0' }))).toEqual({ mail: false, issuer: null });
    expect(waysIn(readEnv({ ...OIDC, OIDC_NAME: 'Bay Institute', SMTP_URL: 'smtps://mail' }))).toEqual({
      mail: true,
      issuer: 'Bay Institute'
    });
  });

  it.each([[{ OIDC_ISSUER: OIDC.OIDC_ISSUER }], [{ ...OIDC, OIDC_CLIENT_SECRET: '' }]])(
    'want the issuer whole: %j',
    (given) => expect(() => readEnv(given)).toThrow(/give OIDC_ISSUER, OIDC_CLIENT_ID and OIDC_CLIENT_SECRET/)
  );

  it.each([
    [{ AUTH_SECRET: 'short' }, /AUTH_SECRET: at least 32/],
    [{ SMTP_URL: 'https://mail' }, /SMTP_URL/],
    [{ MAIL_FROM: 'a@b.org\r\nBcc: c@d.org' }, /MAIL_FROM: an address/]
  ])('name a setting that does not fit: %j', (given, words) => expect(() => readEnv(given)).toThrow(words));
});
