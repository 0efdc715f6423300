import type { Person } from '$lib/server/auth/person';
import type { Database } from '$lib/server/db/client';

declare global {
  namespace App {
    interface Error {
      message: string;
      /** Short name of what went wrong, for scripts. */
      code?: string;
      /** Finds the entry in the log. */
      errorId?: string;
    }
    interface Locals {
      db: Database;
      /** Who is signed in; null for visitors. */
      person: Person | null;
      /** Set by handleError: the database could not be written. */
      storageTrouble?: 'busy' | 'full';
    }
  }
}
export {};
