import type { Role } from '../team/roles';
import type { Scope } from './scopes';

/** A token as its team sees it: never the token itself. Times are milliseconds since 1970. */
export interface TeamToken {
  id: string;
  name: string;
  /** How it begins: `sev_` and eight letters. */
  hint: string;
  role: Role;
  scopes: Scope[];
  by: string;
  createdAt: number;
  expiresAt: number;
  /** Beginning of the last day of use, UTC. */
  lastUsedOn: number | null;
  /** `ended`: who made it left the team since, or is disabled. */
  state: 'open' | 'expired' | 'revoked' | 'ended';
}
