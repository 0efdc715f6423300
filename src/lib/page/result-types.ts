import type { CountData, DiagnoseOptions, Diagnosis, Progress } from '$lib/stats/types';

export interface Result {
  diagnosis: Diagnosis;
  data: CountData;
  options: DiagnoseOptions;
  /** Name of the file, example or dataset; null when pasted. */
  name: string | null;
  /** The part after # that reopens it; null when the counts are too many for an address. */
  address: string | null;
}

export interface Running extends Progress {
  /** performance.now() when it began. */
  since: number;
}
