import { narrowerRole } from '$lib/model/team/narrower-role';
import { ROLES, type Role } from '$lib/model/team/roles';
import { ACTIONS, type Action, type Grant } from './actions';

/**
 * Roles that an action is granted to: wholly, or for what the person made.
 *
 * @param most what somebody acts as at most, whatever their own role: the role of a token
 */
export function rolesFor(action: Action, grant: Exclude<Grant, 'no'>, most: Role = 'lead'): Role[] {
  return ROLES.filter((role) => ACTIONS[action][narrowerRole(role, most)] === grant);
}
