import type { Histogram, Verdict } from '../../../stats/types';
import type { Conditions } from './conditions';

/** A dataset as its own page shows it. Times are milliseconds since 1970. */
export interface OneDataset {
  id: string;
  conditions: Conditions;
  /** Grows with every edit. */
  version: number;
  kind: 'histogram' | 'shots';
  /** The counts, those of a shot list summed: its order is in the files. */
  histogram: Histogram;
  batches: number | null;
  /** Which dataset of a file that holds several. */
  part: string | null;
  digest: string;
  shots: number;
  mean: number;
  largest: number;
  file: { id: string; name: string; size: number; sha256: string };
  by: string | null;
  createdBy: string | null;
  createdAt: number;
  updatedAt: number;
  /** Put aside since. */
  deletedAt: number | null;
  reports: { id: string; number: number; verdict: Verdict; createdAt: number; by: string | null }[];
  jobs: {
    id: string;
    status: 'queued' | 'running' | 'done' | 'failed' | 'cancelled';
    createdAt: number;
    reportId: string | null;
  }[];
}
