import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, team } from '../../db/schema';
import type { Actor } from '../access/actor';
import { mayWhere } from '../access/may-where';
import { lastDispersion, lastVerdict } from '../datasets/report-columns';
import { conditionColumns } from '../reports/condition-columns';

const columns = {
  id: dataset.id,
  digest: dataset.digest,
  counts: dataset.counts,
  verdict: lastVerdict,
  dispersion: lastDispersion,
  ...conditionColumns
};

/**
 * The datasets of ids, each once, with their counts, conditions and newest answer, in the order of the ids; null when
 * one is not the team's, is put aside, or the actor may not make something of it.
 */
export function chosenDatasets(db: Pick<Database, 'select'>, actor: Actor, ids: string[]) {
  const wanted = [...new Set(ids)];
  const rows = db
    .select(columns)
    .from(dataset)
    // Alone in a query, its id would be written without its table, and mean that of the report in `lastVerdict`.
    .innerJoin(team, eq(team.id, dataset.teamId))
    .where(
      and(
        inArray(dataset.id, wanted),
        eq(dataset.teamId, actor.teamId),
        isNull(dataset.deletedAt),
        mayWhere(actor, 'diagnose', dataset.teamId)
      )
    )
    .all();
  const found = new Map(rows.map((row) => [row.id, row]));
  const chosen = wanted.flatMap((id) => found.get(id) ?? []);
  return chosen.length === wanted.length ? chosen : null;
}

export type ChosenDataset = NonNullable<ReturnType<typeof chosenDatasets>>[number];
