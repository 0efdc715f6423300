import { hashPassword, passwordFits } from '$lib/server/auth/password-hash';
import { describe, expect, it } from 'vitest';

describe('passwords', () => {
  it('are kept as argon2id with the settings of the OWASP Password Storage Cheat Sheet, salted', async () => {
    const [a, b] = await Promise.all([hashPassword('marram'), hashPassword('marram')]);
    // OWASP: "Argon2id with a minimum configuration of 19 MiB of memory, an iteration count of 2, and 1 degree of
    // parallelism". The text form is that of the reference implementation.
    expect(a).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(a).not.toBe(b);
    expect(await passwordFits(a, 'marram')).toBe(true);
    expect(await passwordFits(b, 'marram ')).toBe(false);
  });

  it('are the same however the keyboard writes an accent', async () => {
    expect(await passwordFits(await hashPassword('Mu\u0308nchen'), 'M\u00fcnchen')).toBe(true);
  });

  it('fit nobody where there is none, after as much work', async () => {
    const kept = await hashPassword('marram');
    const cost = async (hash: string | null) => {
      const times = [];
      for (let i = 0; i < 7; i++) {
        const begin = performance.now();
        expect(await passwordFits(hash, 'wrong')).toBe(false);
        times.push(performance.now() - begin);
      }
      return times.sort((a, b) => a - b)[3];
    };
    await cost(null);
    // Medians of seven; without the work the ratio would be near 0.
    expect((await cost(null)) / (await cost(kept))).toBeGreaterThan(0.4);
    expect(await passwordFits(null, 'nobody has this password')).toBe(false);
  });
});
