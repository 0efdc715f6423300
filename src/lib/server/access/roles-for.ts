import { ROLES, type Role } from '$lib/model/team/roles';
import { ACTIONS, type Action, type Grant } from './actions';

/** Roles that an action is granted to: wholly, or for what the person made. */
export function rolesFor(action: Action, grant: Exclude<Grant, 'no'>): Role[] {
  return ROLES.filter((role) => ACTIONS[action][role] === grant);
}
