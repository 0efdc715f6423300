import type { ReadOptions, ReadResult } from '$lib/formats/types';
import type { CountData, DiagnoseOptions, Diagnosis, Progress } from '$lib/stats/types';

/** What the page and its two workers say to each other. */
export interface ReadRequest {
  id: number;
  input: string | Uint8Array;
  options: ReadOptions;
}

export interface ReadAnswer {
  id: number;
  result: ReadResult;
}

export interface DiagnoseRequest {
  data: CountData;
  options: DiagnoseOptions;
}

export type DiagnoseAnswer =
  | { kind: 'progress'; progress: Progress }
  | { kind: 'done'; diagnosis: Diagnosis }
  | { kind: 'refused'; reason: string }
  | { kind: 'failed'; message: string };
