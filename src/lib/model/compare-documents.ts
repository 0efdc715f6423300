/** One place where two documents differ. */
export interface Difference {
  /** Keys from the root, "moments.mean.value" or "tests[2].p". */
  path: string;
  /** What stands there, as JSON; null where there is nothing. */
  theirs: string | null;
  ours: string | null;
}

/**
 * Where two JSON documents differ, in the order of the first, keys only the second has after those. A list of another
 * length is told by its length and compared as far as both go.
 *
 * @param theirs the stored document, `ours` the one computed here
 */
export function compareDocuments(theirs: unknown, ours: unknown, path = ''): Difference[] {
  if (Array.isArray(theirs) && Array.isArray(ours)) {
    const shared = Math.min(theirs.length, ours.length);
    const length: Difference[] =
      theirs.length === ours.length
        ? []
        : [{ path: `${path}.length`, theirs: String(theirs.length), ours: String(ours.length) }];
    const rows = theirs.slice(0, shared);
    return [...length, ...rows.flatMap((value, i) => compareDocuments(value, ours[i], `${path}[${i}]`))];
  }
  if (isObject(theirs) && isObject(ours)) {
    const keys = [...new Set([...Object.keys(theirs), ...Object.keys(ours)])];
    return keys.flatMap((key) => compareDocuments(theirs[key], ours[key], path ? `${path}.${key}` : key));
  }
  return Object.is(theirs, ours) ? [] : [{ path, theirs: text(theirs), ours: text(ours) }];
}

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

const text = (value: unknown): string | null => (value === undefined ? null : JSON.stringify(value));
