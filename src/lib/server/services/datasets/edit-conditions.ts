import { and, eq, isNull } from 'drizzle-orm';
import { CONDITION_NAMES, type Conditions } from '../../../model/team/datasets/conditions';
import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { nameDevice } from '../devices/name-device';
import { recordEvent } from '../events/record-event';
import { conditionsOf } from './conditions-of';
import { lastEditor } from './last-editor';
import { misfits } from './misfits';

export type EditedConditions =
  | { ok: true; version: number; changed: boolean }
  | { ok: false; reason: 'unknown' }
  | { ok: false; reason: 'bad-conditions'; problems: ConditionProblems }
  /** Somebody saved other conditions since this edit began: what stands now, and who wrote it when. */
  | { ok: false; reason: 'stale'; current: Conditions; version: number; by: string | null; at: number };

/**
 * Changes the conditions of a dataset, if they still are as the editor saw them.
 *
 * @param version of the conditions that the edit began with
 */
export function editConditions(
  db: Database,
  actor: Actor,
  id: string,
  edit: { version: number; conditions: Conditions },
  now = Date.now()
): EditedConditions {
  return db.transaction(
    (tx): EditedConditions => {
      const row = tx
        .select()
        .from(dataset)
        .where(and(eq(dataset.id, id), isNull(dataset.deletedAt), mayWhere(actor, 'edit', dataset.teamId)))
        .get();
      if (!row) return { ok: false, reason: 'unknown' };
      const current = conditionsOf(row);
      const changed = CONDITION_NAMES.filter((name) => current[name] !== edit.conditions[name]);
      // A second press of the button finds everything as it wants it.
      if (changed.length === 0) return { ok: true, version: row.version, changed: false };
      if (row.version !== edit.version) {
        const by = lastEditor(tx, actor.teamId, id);
        return { ok: false, reason: 'stale', current, version: row.version, by, at: row.updatedAt };
      }
      const problems = misfits(edit.conditions, JSON.parse(row.counts) as CountData);
      if (Object.keys(problems).length > 0) return { ok: false, reason: 'bad-conditions', problems };
      const version = row.version + 1;
      tx.update(dataset)
        .set({ ...edit.conditions, version, updatedAt: now })
        .where(eq(dataset.id, id))
        .run();
      nameDevice(tx, { ...edit.conditions, teamId: actor.teamId, createdBy: actor.personId }, now);
      const detail = { changed: changed.join(', '), version };
      const happening = { teamId: actor.teamId, personId: actor.personId, thing: id, detail };
      recordEvent(tx, { ...happening, action: 'dataset.edit' }, now);
      return { ok: true, version, changed: true };
    },
    { behavior: 'immediate' }
  );
}
