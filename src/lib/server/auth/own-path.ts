/** Any host will do: what matters is whether the path leaves it. */
const HERE = 'http://here.invalid';

/**
 * A path of this application to go on to, from an address that anybody may have written: everything that a browser
 * would take for another site (`//other`, `/\other`, `https:…`, control characters) becomes the fallback.
 */
export function ownPath(text: string | null | undefined, fallback = '/teams'): string {
  if (!text || !/^\/(?![/\\])/.test(text) || text.length > 2000) return fallback;
  const url = URL.canParse(text, HERE) ? new URL(text, HERE) : null;
  if (url?.origin !== HERE) return fallback;
  // Written anew, as `/.//other` would come out of the parser as `//other`.
  const path = url.pathname + url.search + url.hash;
  return path.startsWith('//') ? fallback : path;
}
