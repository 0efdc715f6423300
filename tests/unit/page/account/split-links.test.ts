import { splitLinks } from '$lib/page/account/split-links';
import { describe, expect, it } from 'vitest';

describe('splitLinks', () => {
  it('cuts a letter at its addresses and loses nothing', () => {
    const text = 'Open\nhttp://localhost:1/a?b=c\nor https://example.org.';
    const pieces = splitLinks(text);
    expect(pieces.filter(({ link }) => link).map((piece) => piece.text)).toEqual([
      'http://localhost:1/a?b=c',
      'https://example.org.'
    ]);
    expect(pieces.map((piece) => piece.text).join('')).toBe(text);
  });

  it('makes no link of anything else', () => {
    expect(splitLinks('javascript:alert(1) "><a>')).toEqual([
      { text: 'javascript:alert(1) "><a>', link: false }
    ]);
    expect(splitLinks('')).toEqual([]);
  });
});
