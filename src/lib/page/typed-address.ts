/** Longest address part that is written; longer ones get cut by mail programs and chat windows. */
const LONGEST = 2000;

/**
 * What was typed into a page's fields as the part of its address after `#`, which browsers keep to themselves.
 * Fields that are as on a fresh page are left out.
 * @returns null when it would be too long for an address
 */
export function writeTyped<Name extends string>(
  fields: Record<Name, string>,
  fresh: Record<Name, string>
): string | null {
  const address = (Object.keys(fresh) as Name[])
    .filter((name) => fields[name] !== fresh[name])
    .map((name) => `${name}=${encodeURIComponent(fields[name])}`)
    .join('&');
  return address.length > LONGEST ? null : address;
}

/**
 * Reads what `writeTyped` wrote; fields that it does not name are as on a fresh page.
 * @returns the fields, and the parts that this page has no field for or cannot read
 */
export function readTyped<Name extends string>(
  fragment: string,
  fresh: Record<Name, string>
): { fields: Record<Name, string>; unknown: string[] } {
  const fields = { ...fresh };
  const unknown: string[] = [];
  for (const part of fragment
    .replace(/^#/, '')
    .slice(0, 2 * LONGEST)
    .split('&')) {
    if (part === '') continue;
    const at = part.indexOf('=');
    const name = (at < 0 ? part : part.slice(0, at)) as Name;
    const value = decoded(at < 0 ? '' : part.slice(at + 1));
    if (Object.hasOwn(fresh, name) && value !== null) fields[name] = value;
    else unknown.push(part.length > 40 ? `${part.slice(0, 40)}…` : part);
  }
  return { fields, unknown };
}

function decoded(text: string): string | null {
  try {
    return decodeURIComponent(text.replaceAll('+', ' '));
  } catch {
    return null;
  }
}
