import { documentText } from '$lib/model/document-text';
import type { FrozenConditions } from '$lib/model/team/frozen-conditions';
import type { DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { and, eq, max } from 'drizzle-orm';
import { createHash } from 'node:crypto';
import type { Database } from '../../db/client';
import { newId } from '../../db/new-id';
import { dataset, report } from '../../db/schema';
import { recordEvent } from '../events/record-event';
import { conditionColumns } from './condition-columns';

export interface NewReport {
  teamId: string;
  datasetId: string;
  document: Diagnosis;
  options: DiagnoseOptions;
  /** Null for the program itself. */
  createdBy: string | null;
}

/**
 * Keeps a diagnosis as a report of its dataset, with the conditions the dataset has now. The document is stored as
 * documentText writes it, with the sha256 of those bytes. Numbers count up within the dataset; what was put aside
 * keeps its own.
 *
 * @param db a transaction of the caller, so that the number is not given twice and the report comes with its job's end
 * @throws when the team has no such dataset
 */
export function saveReport(
  db: Pick<Database, 'select' | 'insert'>,
  { teamId, datasetId, document, options, createdBy }: NewReport,
  now = Date.now()
): { id: string; number: number } {
  const conditions: FrozenConditions | undefined = db
    .select(conditionColumns)
    .from(dataset)
    .where(and(eq(dataset.id, datasetId), eq(dataset.teamId, teamId)))
    .get();
  if (!conditions) throw new Error('The dataset of this report is gone.');
  const highest = db
    .select({ number: max(report.number) })
    .from(report)
    .where(eq(report.datasetId, datasetId))
    .get();
  const text = documentText(document);
  const id = newId();
  const number = (highest?.number ?? 0) + 1;
  db.insert(report)
    .values({
      id,
      teamId,
      datasetId,
      number,
      document: text,
      sha256: createHash('sha256').update(text).digest('hex'),
      options: JSON.stringify(options),
      engineVersion: document.engine.version,
      verdict: document.answer.verdict,
      conditions: JSON.stringify(conditions),
      createdBy,
      createdAt: now
    })
    .run();
  recordEvent(
    db,
    { action: 'report.make', teamId, personId: createdBy, thing: id, detail: { dataset: datasetId, number } },
    now
  );
  return { id, number };
}
