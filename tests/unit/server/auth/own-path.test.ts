import { ownPath } from '$lib/server/auth/own-path';
import { describe, expect, it } from 'vitest';

describe('ownPath', () => {
  it.each(['/', '/team/bay-side/datasets?q=a%20b&page=2#row-3', '/link/abc', '/account?x=//y'])(
    'keeps %s',
    (path) => expect(ownPath(path)).toBe(path)
  );

  it.each([
    '',
    'teams',
    '//example.org',
    '/\\example.org',
    '\\\\example.org',
    '/\t/example.org',
    '/\n/example.org',
    '/.//example.org',
    '/a/..//example.org',
    'https://example.org/',
    'javascript:alert(1)',
    ' //example.org',
    `/${'a'.repeat(3000)}`
  ])('goes to the teams instead of %j', (path) => expect(ownPath(path)).toBe('/teams'));

  it('goes to the teams when nothing is asked for', () => expect(ownPath(null)).toBe('/teams'));
});
