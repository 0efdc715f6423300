import { makeFileLimit } from '$lib/server/services/links/spend-file';
import { describe, expect, it } from 'vitest';

describe('files through a link', () => {
  it('are counted a link, and the one too many is told how long to wait', async () => {
    const spend = makeFileLimit({ quota: 2, window: 60 });
    // At once, so that none slips through between looking and counting.
    const three = await Promise.all([spend('one'), spend('one'), spend('one')]);
    expect(three.map(({ ok }) => ok).sort()).toEqual([false, true, true]);
    const refused = await spend('one');
    expect(refused).toMatchObject({ ok: false, reason: 'wait' });
    const seconds = refused.ok ? 0 : refused.seconds;
    expect(seconds).toBeGreaterThanOrEqual(1);
    expect(seconds).toBeLessThanOrEqual(60);
    expect(await spend('another')).toEqual({ ok: true });
  });
});
