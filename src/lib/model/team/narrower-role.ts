import { ROLES, type Role } from './roles';

/** Of two roles the one that may less. */
export const narrowerRole = (a: Role, b: Role): Role => (ROLES.indexOf(a) > ROLES.indexOf(b) ? a : b);
