import { newId } from '$lib/server/db/new-id';
import { newToken } from '$lib/server/auth/new-token';
import { shownPath } from '$lib/server/running/shown-path';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const { token } = newToken();

describe('shownPath', () => {
  it.each([
    ['/team/bay-side/datasets/edit?id=4&counts=0,185', '/team/bay-side/datasets/edit'],
    ['/password/new?token=abc', '/password/new'],
    [`/link/${token}`, '/link/…'],
    [`/link/${token}/report.pdf`, '/link/…/report.pdf'],
    [`/link/${token}/__data.json?x=1`, '/link/…/__data.json'],
    ['/link/short', '/link/…'],
    [`/%6Cink/${token}`, '/link/…'],
    [`/%6cin%6b/short`, '/link/…'],
    [`http://elsewhere.example/link/${token}`, '/link/…'],
    [`/invitation/${token}`, '/invitation/…'],
    ['/unsubscribe/a.b.c', '/unsubscribe/…'],
    ['/auth/callback/oidc?code=abc&state=def', '/auth/…/oidc'],
    [`/nowhere/${token}`, '/nowhere/…'],
    [`/nowhere/sev_a1b2c3d4_${token}`, '/nowhere/…'],
    ['/nowhere/ada@example.org', '/nowhere/…'],
    ['/nowhere/ada%40example.org', '/nowhere/…'],
    ['/%E0%A4%A', '/…'],
    ['/', '/'],
    ['/link', '/link']
  ])('of %s shows %s', (address, shown) => expect(shownPath(address)).toBe(shown));

  it('keeps the ids by which a line is found', () => {
    const path = `/team/bay-side/reports/${newId()}/report.pdf`;
    expect(shownPath(path)).toBe(path);
  });

  it('never shows a token, wherever it stands and however it is written', () => {
    const encoded = (text: string, every: boolean[]) =>
      [...text].map((letter, i) => (every[i % every.length] ? `%${hex(letter)}` : letter)).join('');
    const hex = (letter: string) => letter.charCodeAt(0).toString(16).padStart(2, '0');
    const places = fc.constantFrom('/link/T', '/link/T/report.pdf', '/x/T', '/invitation/T?T', '/?T', '/x#T');
    fc.assert(
      fc.property(places, fc.array(fc.boolean(), { minLength: 1, maxLength: 9 }), (place, every) => {
        expect(decodeURIComponent(shownPath(place.replaceAll('T', encoded(token, every))))).not.toContain(
          token
        );
      }),
      { numRuns: 2000 }
    );
  });
});
