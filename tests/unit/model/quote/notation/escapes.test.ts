import { escapeLatex } from '$lib/model/quote/notation/escape-latex';
import { escapeMarkdown } from '$lib/model/quote/notation/escape-markdown';
import { inNotation } from '$lib/model/quote/notation/notation';
import { oneLine } from '$lib/model/quote/notation/one-line';
import { code, equation, math, nameOf, number, words } from '$lib/model/quote/span';
import { roundAt } from '$lib/model/quote/numbers/round-at';
import { roundToDigits } from '$lib/model/quote/numbers/round-to-digits';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** Any text, with plenty of signs that mean something somewhere. */
const nasty = fc
  .array(
    fc.oneof(
      fc.constantFrom(
        ...'\\{}$&#%_^~<>|"\'`‘“’–—-,!?*[]()=@:./+\n\r\t \u2028\u202e',
        '\\input',
        '\\n',
        '--',
        "''",
        '%0',
        '\r\n\r\n',
        '</div>',
        '![x](y)',
        'www.x.org'
      ),
      fc.string({ unit: 'grapheme', maxLength: 4 })
    ),
    { maxLength: 30 }
  )
  .map((parts) => parts.join(''));

describe('LaTeX', () => {
  it.each([
    ['50% of R&D #1_a', '50\\% of R\\&D \\#1\\_a'],
    ['a\\b{c}$d', 'a\\textbackslash{}b\\textbraceleft{}c\\textbraceright{}\\$d'],
    ['~^', '\\textasciitilde{}\\textasciicircum{}'],
    ['<a|b>', '\\textless{}a\\textbar{}b\\textgreater{}'],
    ['say "x" ?`', "say ''x'' ?\\`{}"],
    ["a--b ---c ''d ,,e", "a-{}-b -{}-{}-c '{}'d ,{},e"],
    ["a–-b -–c —--d ’'e", "a--{}-b -{}--c ---{}-{}-d '{}'e"],
    ['Übergänge, Ωμέγα, 量子, кинки', 'Übergänge, Ωμέγα, 量子, кинки'],
    ['3.5 × 10⁻⁷ at 95\u202f%', '3.5 $\\times$ 10$^{-7}$ at 95\\,\\%']
  ])('sets %s as it stands', (text, expected) => expect(escapeLatex(text)).toBe(expected));

  it('leaves no sign of its own that was typed, in any text', () => {
    // What the escapes are made of; taken out, no special sign may be left, and braces and dollars pair.
    const ours =
      /\\(textbackslash|textbraceleft|textbraceright|textasciitilde|textasciicircum|textless|textgreater|textbar|dots)\{\}|\\[#$%&_,]|\\`\{\}|\$(-|\\times|\\le|\\ge|\^\{[-\d]+\})\$|(?<=[-'`,?!])\{\}|~/g;
    fc.assert(
      fc.property(nasty, (text) => {
        const latex = inNotation([nameOf(text)], 'latex');
        const typed = oneLine(text).replaceAll('\u00a0', '').includes('~');
        expect(latex.replace(ours, '')).not.toMatch(/[\\{}$&#%_^~]/);
        if (typed) expect(latex).toContain('\\textasciitilde{}');
        expect(latex).not.toMatch(/[\n\r]|[?!]`/);
        if (!/[–—]/.test(text)) expect(latex).not.toMatch(/--/);
        expect(latex).not.toMatch(/-{4}/);
      }),
      { numRuns: 3000 }
    );
  });

  it('can be read back: no two texts look alike, and none is lost', () => {
    const back = (latex: string) =>
      latex.replace(/(?<=[-',])\{\}/g, '').replace(
        /\\textbackslash\{\}|\\textbraceleft\{\}|\\textbraceright\{\}|\\textasciitilde\{\}|\\textasciicircum\{\}|\\textless\{\}|\\textgreater\{\}|\\textbar\{\}|\\`\{\}|\\([#$%&_])/g,
        (found, sign: string | undefined) =>
          sign ??
          {
            '\\textbackslash{}': '\\',
            '\\textbraceleft{}': '{',
            '\\textbraceright{}': '}',
            '\\textasciitilde{}': '~',
            '\\textasciicircum{}': '^',
            '\\textless{}': '<',
            '\\textgreater{}': '>',
            '\\textbar{}': '|',
            '\\`{}': '`'
          }[found]!
      );
    // Without signs that are set in another spelling on purpose.
    const plain = nasty.map((text) => oneLine(text).replace(/["\u2009-\u2212\u00a0\u202f×≤≥…⁰¹²³⁴-⁹⁻]/g, ''));
    fc.assert(
      fc.property(plain, (text) => {
        expect(back(escapeLatex(text))).toBe(text);
      }),
      { numRuns: 3000 }
    );
  });

  it('sets numbers, formulas and digests', () => {
    const p = equation('p', '≤', roundToDigits(2.5e-7, 2));
    expect(
      inNotation(
        words`${p} of ${number(roundAt(-12345.2, -1))}, ${math('μ(1 − μ/N)')} and ${math('G²')}`,
        'latex'
      )
    ).toBe('$p \\le 2.5 \\times 10^{-7}$ of $-12\\,345.2$, $\\mu (1 - \\mu /N)$ and $G^2$');
    expect(inNotation([code('0123456789abcdef0_')], 'latex')).toBe(
      '\\texttt{01234567\\allowbreak{}89abcdef\\allowbreak{}0\\_}'
    );
  });
});

describe('Markdown', () => {
  it.each([
    ['*a* _b_ `c`', '\\*a\\* \\_b\\_ \\`c\\`'],
    ['[x](http://y.z) <b>', '\\[x\\]\\(http\\://y\\.z\\) \\<b\\>'],
    ['fw 3.3. # 1 | $x$ ~~y~~', 'fw 3\\.3. \\# 1 \\| \\$x\\$ \\~\\~y\\~\\~'],
    ['a\\b &amp; !', 'a\\\\b \\&amp; \\!'],
    ['Übergänge 量子', 'Übergänge 量子']
  ])('keeps %s text', (text, expected) => expect(escapeMarkdown(text)).toBe(expected));

  it('leaves no sign that begins markup without a backslash, and can be read back', () => {
    fc.assert(
      fc.property(nasty, (text) => {
        const markdown = inNotation([nameOf(text)], 'markdown');
        const read = markdown.replace(/\\([!-/:-@[-`{-~])/g, '$1');
        expect(read).toBe(oneLine(text));
        expect(markdown.replace(/\\[!-/:-@[-`{-~]/g, '')).not.toMatch(/[\\`*_[\]<>#&~|$!@\n]/);
      }),
      { numRuns: 3000 }
    );
  });

  it('slants symbols', () =>
    expect(
      inNotation(
        words`${equation('p', '=', roundToDigits(0.18, 2))}, ${math('G² = 2SD')}, ${code('ab')}`,
        'markdown'
      )
    ).toBe('*p* = 0.18, *G*² = 2*SD*, `ab`'));
});

describe('typed text', () => {
  it('is one line, without marks that turn what follows', () => {
    expect(oneLine(' a\n\nb\u2029c \u202ed\u2066e\ufeff\ud800 ')).toBe('a b c de\ufffd');
    fc.assert(
      fc.property(nasty, (text) => {
        expect(oneLine(oneLine(text))).toBe(oneLine(text));
      })
    );
  });
});
