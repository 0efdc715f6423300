/**
 * Whether an error says that the database could not be written: `busy` when another writer held it for longer than the
 * wait, `full` when the disk has no room. Nothing is saved then: SQLite takes the transaction back.
 */
export function storageTrouble(error: unknown): 'busy' | 'full' | null {
  if (!(error instanceof Error)) return null;
  const code = 'code' in error ? String(error.code) : '';
  if (code.startsWith('SQLITE_BUSY') || code.startsWith('SQLITE_LOCKED')) return 'busy';
  if (code.startsWith('SQLITE_FULL') || code === 'SQLITE_IOERR_WRITE') return 'full';
  // Drizzle wraps the driver's errors.
  return storageTrouble(error.cause);
}
