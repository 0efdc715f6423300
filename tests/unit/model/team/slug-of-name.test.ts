import { slugOfName } from '$lib/model/team/slug-of-name';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { match } from '../../../../src/params/slug';

describe('slugOfName', () => {
  it.each([
    ['Bay-side chain laboratory', 'bay-side-chain-laboratory'],
    ['  Ångström & Söhne, Straße 3 ', 'angstrom-sohne-strasse-3'],
    ['Ærø Ñandú team', 'aero-nandu-team'],
    ['Œuvre Łódź Đà Þór ẞ', 'oeuvre-lodz-da-thor-ss'],
    ['A\u030angstro\u0308m ǿ', 'angstrom-o'],
    ['量子', ''],
    ['X', ''],
    ['a'.repeat(39) + ' and more', 'a'.repeat(39)]
  ])('%j becomes %j', (name, slug) => expect(slugOfName(name)).toBe(slug));

  it('gives nothing but what the addresses of teams take, or nothing', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 90 }), (name) => {
        const slug = slugOfName(name);
        return slug === '' || match(slug);
      })
    );
  });
});
