import { limitHeaders, makeRequestLimits, REQUEST_LIMITS } from '$lib/server/auth/request-limits';
import { describe, expect, it } from 'vitest';

describe('the limit on requests', () => {
  it('counts each key by itself and refuses the one too many', async () => {
    const few = { quota: 2, window: 60 };
    const spend = makeRequestLimits({ token: few, unknown: few });
    expect(await spend('token', 'a')).toMatchObject({ ok: true, left: 1 });
    expect(await spend('token', 'a')).toMatchObject({ ok: true, left: 0 });
    const third = await spend('token', 'a');
    expect(third).toMatchObject({ ok: false, left: 0 });
    expect(third.seconds).toBeGreaterThanOrEqual(1);
    expect(third.seconds).toBeLessThanOrEqual(60);
    expect(await spend('token', 'b')).toMatchObject({ ok: true, left: 1 });
    expect(await spend('unknown', 'a')).toMatchObject({ ok: true, left: 1 });
  });

  it('counts some requests as several', async () => {
    const ten = { quota: 10, window: 60 };
    const spend = makeRequestLimits({ token: ten, unknown: ten });
    expect(await spend('token', 'a', 7)).toMatchObject({ ok: true, left: 3 });
    expect(await spend('token', 'a')).toMatchObject({ ok: true, left: 2 });
    expect(await spend('token', 'a', 7)).toMatchObject({ ok: false, left: 0 });
  });

  // Field syntax: the examples of draft-ietf-httpapi-ratelimit-headers, sections 3 and 4, written down from memory.
  it('is told in the fields of the draft', () => {
    const { quota, window } = REQUEST_LIMITS.token;
    expect(limitHeaders('token', { ok: true, left: 7, seconds: 30 })).toEqual({
      'ratelimit-policy': `"token";q=${quota};w=${window}`,
      ratelimit: '"token";r=7;t=30'
    });
    expect(limitHeaders('token', { ok: false, left: 0, seconds: 12 })).toMatchObject({ 'retry-after': '12' });
  });
});
