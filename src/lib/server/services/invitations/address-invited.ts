import type { Database } from '../../db/client';
import { readInvitation } from './read-invitation';

/**
 * The address that an invitation is for, from the path of its page: who is sent from there to sign in need not type it.
 *
 * @returns '' for every other path, and for an invitation whose page does not show the address (closed or unknown)
 */
export function addressInvited(db: Pick<Database, 'select'>, path: string, now = Date.now()): string {
  const token = /^\/invitation\/([\w-]+)$/.exec(path)?.[1];
  if (!token) return '';
  const read = readInvitation(db, token, null, now);
  return read.ok ? read.invitation.email : '';
}
