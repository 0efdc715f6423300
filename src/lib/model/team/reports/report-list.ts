import type { Verdict } from '$lib/stats/types';

/** One line of the table of reports; the dataset's name and device are those of now. */
export interface ReportRow {
  id: string;
  number: number;
  datasetId: string;
  dataset: string;
  device: string | null;
  firmware: string | null;
  group: string | null;
  shots: number;
  verdict: Verdict;
  engineVersion: string;
  by: string | null;
  createdAt: number;
  /** Threads of remarks, and how many of them are open. */
  threads: number;
  open: number;
}

export interface ReportList {
  rows: ReportRow[];
  /** Reports that the query finds, and all that the team has. */
  total: number;
  all: number;
  page: number;
  size: number;
}
