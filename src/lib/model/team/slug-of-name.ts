/**
 * The name of a team as an address takes it: "Küstenlabor 2" becomes kustenlabor-2. Accents go, what is no letter or
 * digit becomes a hyphen, 40 characters at most.
 *
 * @returns '' when fewer than two characters are left (a name in another script)
 */
export function slugOfName(name: string): string {
  const slug = name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/ß/g, 'ss')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 40)
    .replace(/^-+|-+$/g, '');
  return slug.length < 2 ? '' : slug;
}
