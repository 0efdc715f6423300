/** The first problem of each field of a link, as its form shows it; one of a list of addresses names its line. */
export function problemsOf(issues: { path: PropertyKey[]; message: string }[]): Record<string, string> {
  const found: Record<string, string> = {};
  for (const { path, message } of issues) {
    const [name, line] = path;
    const text = typeof line === 'number' ? `Line ${line + 1} ${message}.` : message;
    found[String(name)] ??= text;
  }
  return found;
}
