import { cleanText } from '$lib/pdf/type/clean-text';
import { describe, expect, it } from 'vitest';

describe('cleanText', () => {
  it.each([
    ['control signs', 'a\u0000b\u001bc', 'abc'],
    ['signs that turn the direction', 'a\u202eb\u2066c\u200f', 'abc'],
    ['line ends, to a blank', 'a\r\nb\u2028c\td', 'a b c d'],
    ['parts of a pair of surrogates', 'a\ud83d', 'a\ufffd'],
    ['letters apart from their marks', 'e\u0301', 'é']
  ])('takes away %s', (_what, text, clean) => {
    expect(cleanText(text)).toBe(clean);
  });

  it('keeps the spaces inside numbers and every letter', () => {
    const text = '1\u202f999 漢字 שלום 😀 <b>&';
    expect(cleanText(text)).toBe(text);
  });
});
