/** Letters that Unicode does not take apart into a Latin letter and an accent, as it does å. */
const LETTERS: Record<string, string> = {
  æ: 'ae',
  ø: 'o',
  ß: 'ss',
  œ: 'oe',
  ł: 'l',
  đ: 'd',
  þ: 'th'
};

/**
 * The name of a team as an address takes it: "Küstenlabor 2" becomes kustenlabor-2. Letters as æ and ø are
 * written out, accents go, what is no letter or digit becomes a hyphen, 40 characters at most.
 *
 * @returns '' when fewer than two characters are left (a name in another script)
 */
export function slugOfName(name: string): string {
  const slug = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[æøßœłđþ]/g, (letter) => LETTERS[letter])
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 40)
    .replace(/^-+|-+$/g, '');
  return slug.length < 2 ? '' : slug;
}
