import type { Verdict } from '$lib/stats/types';

/** What the first page of a team shows. */
export interface TeamHome {
  /** Newest first, and how many there are in all. */
  reports: {
    total: number;
    newest: {
      id: string;
      number: number;
      dataset: string;
      verdict: Verdict;
      createdAt: number;
      by: string | null;
    }[];
  };
  /** Datasets without a report, newest first. */
  waiting: { total: number; newest: { id: string; name: string; shots: number; createdAt: number }[] };
  datasets: number;
  /** Threads that nobody settled, the one spoken in last first. */
  remarks: {
    total: number;
    newest: {
      id: string;
      reportId: string;
      number: number;
      dataset: string;
      section: string;
      body: string;
      by: string;
      at: number;
    }[];
  };
  jobs: { total: number; first: { id: string; dataset: string; running: boolean; share: number }[] };
}
