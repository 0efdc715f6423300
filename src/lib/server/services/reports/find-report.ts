import { frozenConditionsSchema, type FrozenConditions } from '$lib/model/team/frozen-conditions';
import type { DiagnoseOptions, Verdict } from '$lib/stats/types';
import { and, eq, isNull, type SQL } from 'drizzle-orm';
import type { Database } from '../../db/client';
import { dataset, person, report } from '../../db/schema';
import { conditionColumns } from './condition-columns';

/** A report as it is kept, and what its dataset says now. */
export interface SavedReport {
  id: string;
  number: number;
  datasetId: string;
  /** The document, byte for byte. */
  text: string;
  sha256: string;
  options: DiagnoseOptions;
  engineVersion: string;
  verdict: Verdict;
  /** Conditions when it was made. */
  conditions: FrozenConditions;
  /** Conditions of the dataset now. */
  conditionsNow: FrozenConditions;
  createdBy: string | null;
  /** Name of who made it; null when made by the program, or when that person is gone. */
  by: string | null;
  createdAt: number;
}

/** The one report that a condition finds, unless it or its dataset was put aside. */
export function findReport(db: Pick<Database, 'select'>, where: SQL | undefined): SavedReport | undefined {
  const row = db
    .select({
      id: report.id,
      number: report.number,
      datasetId: report.datasetId,
      text: report.document,
      sha256: report.sha256,
      options: report.options,
      engineVersion: report.engineVersion,
      verdict: report.verdict,
      conditions: report.conditions,
      conditionsNow: conditionColumns,
      createdBy: report.createdBy,
      by: person.name,
      createdAt: report.createdAt
    })
    .from(report)
    .innerJoin(dataset, eq(dataset.id, report.datasetId))
    .leftJoin(person, eq(person.id, report.createdBy))
    .where(and(where, isNull(report.deletedAt), isNull(dataset.deletedAt)))
    .get();
  if (!row) return undefined;
  return {
    ...row,
    options: JSON.parse(row.options) as DiagnoseOptions,
    conditions: frozenConditionsSchema.parse(JSON.parse(row.conditions))
  };
}
