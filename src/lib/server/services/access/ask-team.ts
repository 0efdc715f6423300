import { and, eq, isNull } from 'drizzle-orm';
import type { Action } from '../../access/actions';
import { can, type Thing } from '../../access/can';
import type { Database } from '../../db/client';
import { membership, person, team } from '../../db/schema';
import { noteRequest } from '../../running/seen-request';
import type { Actor } from './actor';

export interface TeamEntry {
  id: string;
  slug: string;
  name: string;
}

export type AskTeam =
  | { ok: true; team: TeamEntry; actor: Actor }
  /** `unknown`: there is no such team, or the person is not in it; which of the two is not told. */
  | { ok: false; reason: 'signed-out' | 'unknown' | 'not-allowed' };

/**
 * Whether a person may do something in the team of a slug.
 *
 * @param personId null when nobody is signed in
 * @param thing leave out for what no single thing is asked about: `own` grants then count as not granted
 */
export function askTeam(
  db: Database,
  personId: string | null,
  slug: string,
  action: Action,
  thing?: Thing
): AskTeam {
  if (personId === null) return { ok: false, reason: 'signed-out' };
  const found = db
    .select({ id: team.id, slug: team.slug, name: team.name, role: membership.role })
    .from(membership)
    .innerJoin(team, eq(team.id, membership.teamId))
    .innerJoin(person, eq(person.id, membership.personId))
    .where(and(eq(team.slug, slug), eq(membership.personId, personId), isNull(person.disabledAt)))
    .get();
  if (!found) return { ok: false, reason: 'unknown' };
  const { role, ...entry } = found;
  noteRequest({ person: personId, team: found.id });
  if (!can({ kind: 'member', personId, role }, action, thing)) return { ok: false, reason: 'not-allowed' };
  return { ok: true, team: entry, actor: { personId, teamId: found.id, role } };
}
