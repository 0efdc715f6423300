import { and, inArray, isNull, eq } from 'drizzle-orm';
import type { BulkEdit } from '../../../model/team/datasets/bulk-edit';
import type { Conditions } from '../../../model/team/datasets/conditions';
import type { ConditionProblems } from '../../../model/team/datasets/read-typed-conditions';
import type { CountData } from '../../../stats/types';
import type { Database } from '../../db/client';
import { dataset } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { nameDevice } from '../devices/name-device';
import { recordEvent } from '../events/record-event';
import { misfits } from './misfits';

/** Conditions that have to go together, with each other and with the counts. */
const EXPERIMENT = ['trials', 'unit', 'geometry', 'misread', 'misreadUncertainty', 'kept'] as const;

export type BulkEdited =
  | { ok: true; changed: number }
  /** At least one of them is not there, or not the team's. */
  | { ok: false; reason: 'unknown' }
  | {
      ok: false;
      reason: 'bad-conditions';
      troubles: { id: string; name: string; problems: ConditionProblems }[];
    };

/**
 * Sets some conditions alike on many datasets, all or none. Other conditions stay as they are, so it cannot undo what
 * somebody else wrote elsewhere; an edit of one of these datasets that is under way is told.
 */
export function bulkEdit(db: Database, actor: Actor, edit: BulkEdit, now = Date.now()): BulkEdited {
  const wanted = [...new Set(edit.datasets)];
  return db.transaction(
    (tx): BulkEdited => {
      const here = and(inArray(dataset.id, wanted), isNull(dataset.deletedAt));
      const rows = tx
        .select()
        .from(dataset)
        .where(and(here, mayWhere(actor, 'edit', dataset.teamId)))
        .all();
      if (rows.length < wanted.length) return { ok: false, reason: 'unknown' };
      const after = rows.map((row) => ({ row, conditions: { ...row, ...edit.set } }));
      const touchesCounts = EXPERIMENT.some((name) => name in edit.set);
      const troubles = after.flatMap(({ row, conditions }) => {
        const problems = touchesCounts ? misfits(conditions, JSON.parse(row.counts) as CountData) : {};
        return Object.keys(problems).length > 0 ? [{ id: row.id, name: row.name, problems }] : [];
      });
      if (troubles.length > 0) return { ok: false, reason: 'bad-conditions', troubles };
      const names = Object.keys(edit.set) as (keyof Conditions)[];
      const changed = after.filter(({ row, conditions }) =>
        names.some((name) => row[name] !== conditions[name])
      );
      for (const { row, conditions } of changed) {
        tx.update(dataset)
          .set({ ...edit.set, version: row.version + 1, updatedAt: now })
          .where(eq(dataset.id, row.id))
          .run();
        nameDevice(tx, { ...conditions, teamId: actor.teamId, createdBy: actor.personId }, now);
        const detail = { changed: names.join(', '), version: row.version + 1 };
        const happening = { teamId: actor.teamId, personId: actor.personId, thing: row.id, detail };
        recordEvent(tx, { ...happening, action: 'dataset.bulk-edit' }, now);
      }
      return { ok: true, changed: changed.length };
    },
    { behavior: 'immediate' }
  );
}
