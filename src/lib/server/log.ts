type Level = 'info' | 'error';

/**
 * Writes one line of JSON to standard error. Addresses never go in whole: the part after `?` can carry
 * somebody's counts.
 */
export function log(level: Level, message: string, details: Record<string, unknown> = {}): void {
  const line = JSON.stringify({ time: new Date().toISOString(), level, message, ...details });
  process.stderr.write(`${line}\n`);
}
