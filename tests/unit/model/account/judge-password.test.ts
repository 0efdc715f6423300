import { judgePassword } from '$lib/model/account/judge-password';
import { HELP, WARNINGS } from '$lib/model/account/password-words';
import { sayWait } from '$lib/model/account/say-wait';
import { describe, expect, it } from 'vitest';

describe('judgePassword', () => {
  it.each([
    ['short', /^It has 5 of at least 10 characters\./],
    ['password123', /common password/],
    ['aaaaaaaaaaaaaaaa', /repeated/],
    ['qwertyuiop[]', /Keys in a row/],
    ['ada@example.org', /your own name or address/],
    ['Invented12', /your own name or address/],
    ['x'.repeat(129), /128 characters are the most/]
  ])('refuses %s and says why', (password, why) => {
    const judged = judgePassword(password, ['ada@example.org', 'Ada Invented']);
    expect(judged.ok).toBe(false);
    expect(judged.why).toMatch(why);
  });

  it.each(['lighthouse brass verdigris', 'пароль из пяти слов', 'kT9$vq2!mZ'])('takes %s', (password) => {
    expect(judgePassword(password, ['ada@example.org'])).toEqual({ ok: true, why: 'This password will do.' });
  });

  it('is done in time with the longest one', () => {
    judgePassword('warm');
    const begin = performance.now();
    for (const piece of ['aB3$', '1', '4@$5!1|0', 'p4$$w0rd']) judgePassword(piece.repeat(128).slice(0, 128));
    // Half a second in all when nothing else runs; without a bound on what is judged, twenty.
    expect(performance.now() - begin).toBeLessThan(6000);
  });

  it('has words for everything that the estimator may say', async () => {
    const keys = await import('@zxcvbn-ts/core').then(({ Options }) => new Options().translations);
    expect(Object.keys(WARNINGS).sort()).toEqual(Object.keys(keys.warnings).sort());
    expect(Object.keys(HELP).sort()).toEqual(Object.keys(keys.suggestions).sort());
  });
});

describe('sayWait', () => {
  it.each([
    [1, '1 second'],
    [59, '59 seconds'],
    [60, '1 minute'],
    [61, '2 minutes'],
    [900, '15 minutes']
  ])('%i: %s', (seconds, words) => expect(sayWait(seconds)).toBe(words));
});
