import { forgiveAttempt, spendAttempt } from '$lib/server/auth/limits';
import { describe, expect, it } from 'vitest';

const refusals = async (attempts: Parameters<typeof spendAttempt>[]) =>
  (await Promise.all(attempts.map((attempt) => spendAttempt(...attempt)))).filter(({ ok }) => !ok).length;

describe('the limits', () => {
  it('let ten passwords of an account be tried at once and no eleventh, from wherever', async () => {
    const tries = Array.from({ length: 25 }, (_, i) => ({ client: `client ${i}`, account: 'one' }));
    expect(await refusals(tries.map((attempt) => ['password', attempt]))).toBe(15);
  });

  it('let one client try forty, over however many accounts', async () => {
    const tries = Array.from({ length: 60 }, (_, i) => ({ client: 'one', account: `account ${i}` }));
    expect(await refusals(tries.map((attempt) => ['password', attempt]))).toBe(20);
  });

  it('say how long to wait, and count mail by itself', async () => {
    const attempt = { client: 'slow', account: 'slow' };
    for (let i = 0; i < 5; i++) expect((await spendAttempt('mail', attempt)).ok).toBe(true);
    const sixth = await spendAttempt('mail', attempt);
    expect(sixth).toMatchObject({ ok: false, reason: 'wait' });
    expect(!sixth.ok && sixth.seconds).toBeGreaterThan(3590);
    expect((await spendAttempt('password', attempt)).ok).toBe(true);
  });

  it('forget the wrong ones before a right one, and never count that', async () => {
    const attempt = { client: 'right', account: 'right' };
    for (let i = 0; i < 100; i++) {
      expect((await spendAttempt('password', attempt)).ok).toBe(true);
      await forgiveAttempt('password', attempt);
    }
  });
});
