/**
 * An error with its stack and its causes, as the log may hold it. The database's errors repeat what was to be written
 * ("params: …"): names, remarks, hashes of passwords. That is left out, and so is what looks like a token or an address.
 */
export function stackOf(error: unknown): string {
  const parts: string[] = [];
  for (let one = error; one !== undefined && one !== null && parts.length < 5; one = causeOf(one))
    parts.push(one instanceof Error ? (one.stack ?? one.message) : String(one));
  return parts
    .join('\ncaused by ')
    .replace(/^params: .*(?:\n(?! +at |caused by ).*)*/gm, 'params: …')
    .replace(/\b(sev|whsec)_[\w+/=-]+|(?<![\w/-])[\w-]{40,}|[^\s@"'<>(),;]+@[\w-]+(\.[\w-]+)+/g, '…');
}

const causeOf = (error: unknown): unknown => (error instanceof Error ? error.cause : undefined);
