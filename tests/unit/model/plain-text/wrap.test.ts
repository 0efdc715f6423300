import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { textWidth, wrap } from '$lib/model/plain-text/wrap';

describe('wrap', () => {
  it('breaks at blanks, and indents what follows', () => {
    const lines = wrap('word '.repeat(30), '  – ').split('\n');
    expect(lines.length).toBe(2);
    expect(lines[0]).toMatch(/^ {2}– word/);
    expect(lines[1]).toMatch(/^ {4}word/);
  });

  it('never breaks a number or an equation', () => {
    for (let width = 60; width <= textWidth; width += 1) {
      const text = `${'x'.repeat(width)} p = 0.02, 3.1 × 10⁻⁵, 26\u202f306`;
      expect(wrap(text)).toMatch(/p = 0\.02,/);
      expect(wrap(text)).toMatch(/3\.1 × 10⁻⁵/);
    }
  });

  it('keeps every word, in lines that fit', () => {
    fc.assert(
      fc.property(fc.array(fc.stringMatching(/^[a-z]{1,20}$/), { maxLength: 60 }), (words) => {
        const wrapped = wrap(words.join(' '), '  – ');
        expect(wrapped.replace('–', '').split(/\s+/).filter(Boolean)).toEqual(words);
        expect(Math.max(...wrapped.split('\n').map((line) => line.length))).toBeLessThanOrEqual(textWidth);
      })
    );
  });
});
