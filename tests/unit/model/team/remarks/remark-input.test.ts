import { nameKey } from '$lib/model/team/remarks/name-key';
import { REMARK_LENGTH } from '$lib/model/team/remarks/lengths';
import { remarkInputSchema, signatureSchema } from '$lib/model/team/remarks/remark-input';
import { sectionOfPart } from '$lib/model/team/remarks/sections';
import { describe, expect, it } from 'vitest';

const bodyOf = (body: string) => remarkInputSchema.safeParse({ section: 'law', threadId: '', body });

describe('remarkInputSchema', () => {
  it('keeps line ends and tabs, and takes every other control sign out', () => {
    const hostile = '  a\r\nb\tc\u0000\u001b[31m\u202Ed\r \n';
    expect(bodyOf(hostile)).toMatchObject({
      success: true,
      data: { section: 'law', threadId: null, body: 'a\nb\tc[31md' }
    });
  });

  it('leaves what looks like markup as the text it is', () => {
    expect(bodyOf('<b onclick="x">n < 3 & m</b>').data?.body).toBe('<b onclick="x">n < 3 & m</b>');
  });

  it('refuses nothing said, too much said, and sections that are none', () => {
    for (const empty of ['', ' \n\t ', '\u202E'])
      expect(bodyOf(empty).error?.issues[0].message).toBe('Write the remark first.');
    expect(bodyOf('x'.repeat(REMARK_LENGTH)).success).toBe(true);
    expect(bodyOf('x'.repeat(REMARK_LENGTH + 1)).error?.issues[0].message).toContain('at most 4000');
    expect(remarkInputSchema.safeParse({ section: 'elsewhere', body: 'x' }).success).toBe(false);
  });
});

describe('signatureSchema', () => {
  it('is one line of at most 80 characters', () => {
    expect(signatureSchema.parse(' R.\n Invented ')).toBe('R. Invented');
    expect(signatureSchema.parse(undefined)).toBe('');
    expect(signatureSchema.safeParse('x'.repeat(81)).success).toBe(false);
  });
});

describe('what a name cannot carry', () => {
  // Code points by the Unicode Character Database (general categories Cc, Cf; Default_Ignorable_Code_Point).
  it.each([
    ['right-to-left override', '\u202e'],
    ['right-to-left mark', '\u200f'],
    ['isolate', '\u2067'],
    ['zero-width space', '\u200b'],
    ['zero-width joiner', '\u200d'],
    ['word joiner', '\u2060'],
    ['byte order mark', '\ufeff'],
    ['soft hyphen', '\u00ad'],
    ['Hangul filler', '\u3164'],
    ['tag letter', '\u{e0041}'],
    ['escape', '\u001b'],
    ['next line', '\u0085']
  ])('a %s', (_, mark) => {
    expect(signatureSchema.parse(`${mark}A${mark}da${mark} ${mark} Invented${mark}`)).toBe('Ada Invented');
    expect(signatureSchema.parse(mark)).toBe('');
  });

  it('leaves letters of any script as they are', () => {
    for (const name of ['Zoë Müller', '王小明', 'Δημήτρης', 'نور', 'O’Neil-Ng, Jr.'])
      expect(signatureSchema.parse(name)).toBe(name);
  });
});

describe('nameKey', () => {
  it('leaves case, accents, spaces and punctuation aside, and nothing else', () => {
    for (const name of ['the  TEAM', 'Thé Téam.', 'T h e-t e a m', 'ＴＨＥ team'])
      expect(nameKey(name)).toBe(nameKey('The team'));
    expect(nameKey('Straße')).toBe(nameKey('STRASSE'));
    expect(nameKey('The teams')).not.toBe(nameKey('The team'));
    expect(nameKey(' — ')).toBe('');
  });
});

describe('sectionOfPart', () => {
  it('knows the parts of the result page', () => {
    expect(['answer', 'counts-and-law', 'explanations', 'provenance', 'links'].map(sectionOfPart)).toEqual([
      'answer',
      'law',
      'explanations',
      'provenance',
      null
    ]);
  });
});
