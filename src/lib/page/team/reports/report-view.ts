import type { FrozenConditions } from '$lib/model/team/frozen-conditions';
import type { DiagnoseOptions, Verdict } from '$lib/stats/types';

/** A saved report as its page gets it; the document comes beside it. */
export interface ReportView {
  id: string;
  number: number;
  datasetId: string;
  sha256: string;
  /** Length of the document. */
  bytes: number;
  options: DiagnoseOptions;
  engineVersion: string;
  verdict: Verdict;
  conditions: FrozenConditions;
  conditionsNow: FrozenConditions;
  by: string | null;
  createdAt: number;
}

/** Another report of the same dataset, to compare with. */
export interface OtherReport {
  id: string;
  number: number;
  verdict: Verdict;
  createdAt: number;
}
