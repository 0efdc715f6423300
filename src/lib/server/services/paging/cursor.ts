/** Where a page ends: the moment and id of its last entry, which nobody else has. */
export interface Cursor {
  at: number;
  id: string;
}

/** A cursor as scripts hand it back; what is in it is no secret, and nothing they should lean on. */
export const writeCursor = ({ at, id }: Cursor): string =>
  Buffer.from(`${at.toString(36)}.${id}`).toString('base64url');

/** @returns null for what was never one of ours */
export function readCursor(text: string): Cursor | null {
  const found = /^([0-9a-z]{1,11})\.([a-z0-9]{26})$/.exec(Buffer.from(text, 'base64url').toString('latin1'));
  if (!found) return null;
  const at = parseInt(found[1], 36);
  return Number.isSafeInteger(at) ? { at, id: found[2] } : null;
}
