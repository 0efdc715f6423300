import type { Role } from '$lib/model/team/roles';

/** A person acting in a team: what services take after the database. */
export interface Actor {
  personId: string;
  teamId: string;
  role: Role;
  /** The token of a script that acts for them; nothing may be done that its own role does not allow. */
  token?: { id: string; name: string; role: Role };
}
