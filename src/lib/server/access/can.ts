import type { Role } from '$lib/model/team/roles';
import { ACTIONS, type Action } from './actions';

/** Whom a question of access is about. */
export type Standing =
  | { kind: 'member'; personId: string; role: Role }
  | { kind: 'referee'; opens: string; allowsRemarks: boolean };

/** What it is about, where that matters: who made it, and the id of the report or sweep it is or belongs to. */
export interface Thing {
  createdBy?: string | null;
  id?: string;
}

/**
 * Whether somebody may do something: the one place that decides. The services repeat it in their SQL (mayWhere),
 * so that a route that forgot to ask still gives nothing away.
 */
export function can(standing: Standing, action: Action, thing: Thing = {}): boolean {
  if (standing.kind === 'referee') {
    if (thing.id !== standing.opens) return false;
    return action === 'see' || (action === 'remark' && standing.allowsRemarks);
  }
  const grant = ACTIONS[action][standing.role];
  return grant === 'yes' || (grant === 'own' && thing.createdBy === standing.personId);
}
