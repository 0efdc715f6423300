import { describe, expect, it } from 'vitest';
import { BadEnvironment, readEnv } from '$lib/server/env';

describe('readEnv', () => {
  it('has a default for everything', () => {
    expect(readEnv({})).toEqual({
      SEVERALTY_DATA: 'data',
      HOST: '127.0.0.1',
      BODY_SIZE_LIMIT: 20_971_520,
      SHUTDOWN_TIMEOUT: 3,
      SHUTDOWN_DELAY: 0,
      MAIL_FROM: 'Severalty <severalty@localhost>',
      OIDC_NAME: 'your institution',
      SEVERALTY_DEMO: 'yes',
      WEBHOOKS_INSIDE: 'no',
      DIGEST_HOUR: 7
    });
  });

  it('takes what is set, and an empty variable as not set', () => {
    expect(readEnv({ PORT: '0', ORIGIN: 'https://counts.example.org' })).toMatchObject({
      PORT: 0,
      ORIGIN: 'https://counts.example.org'
    });
    expect(readEnv({ PORT: '', HOST: '', ORIGIN: '', SEVERALTY_DATA: '', SHUTDOWN_TIMEOUT: '' })).toEqual(
      readEnv({})
    );
  });

  it.each([
    ['PORT', '70000'],
    ['PORT', '80a'],
    ['PORT', '1.5'],
    ['ORIGIN', 'counts.example.org'],
    ['ORIGIN', 'file:///etc'],
    ['SHUTDOWN_TIMEOUT', '-1'],
    ['SHUTDOWN_DELAY', '1e9'],
    ['LOG_LEVEL', 'loud'],
    ['METRICS_TOKEN', 'short'],
    ['BODY_SIZE_LIMIT', '10M']
  ])('refuses %s=%s by name', (name, value) => {
    expect(() => readEnv({ [name]: value })).toThrow(BadEnvironment);
    expect(() => readEnv({ [name]: value })).toThrow(name);
  });
});
