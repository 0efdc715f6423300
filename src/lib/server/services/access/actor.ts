import type { Role } from '$lib/model/team/roles';

/** A person acting in a team: what services take after the database. */
export interface Actor {
  personId: string;
  teamId: string;
  role: Role;
}
