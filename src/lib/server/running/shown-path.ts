/** What follows one of these in an address lets in whoever has it. */
const SECRET_AFTER = /^(link|invitation|unsubscribe|auth)$/;
/** Our tokens have 43 characters, our ids 26; names of files have dots. */
const LONG = /^[^.]{32,}$|^(sev|whsec)_/;
const MOST = 200;

/**
 * The path of an address as the log may hold it: without what follows `?`, which can carry counts and one-time tokens,
 * and with the secrets within it, and anything like a mail address, left out.
 *
 * @param address as it came in the request, with or without a host, encoded or not
 */
export function shownPath(address: string): string {
  const path = address.replace(/^https?:\/\/[^/?#]*/i, '').replace(/[?#].*$/s, '');
  // Kit decodes before it looks for a route: %6Cink is link.
  const parts = decoded(path).split('/');
  const shown = parts.map((part, place) => {
    const secret = SECRET_AFTER.test(parts[place - 1] ?? '') || LONG.test(part) || part.includes('@');
    return secret && part !== '' ? '…' : part;
  });
  const text = shown.join('/');
  return text.length > MOST ? `${text.slice(0, MOST)}…` : text;
}

function decoded(path: string): string {
  try {
    return decodeURIComponent(path);
  } catch {
    return '/…';
  }
}
