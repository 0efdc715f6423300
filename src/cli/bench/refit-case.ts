import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { projectFolder } from '$lib/server/project-folder';
import { fitData, type FitData } from '$lib/stats/fit/fit-data';

export type RefitCaseId = 'weldon12' | 'lz32' | 'lz256';

/** An observed histogram, and resamples of it whose best log-likelihoods are known. */
export interface RefitCase {
  id: RefitCaseId;
  trials: number;
  observed: FitData;
  /** Null where none are kept: they are then drawn from the fit. */
  resampled: { data: FitData; best: number }[] | null;
}

interface CaseFile {
  trials: number;
  histogram: number[];
  resampled?: number[][];
  best?: number[];
}

/** Reads fixtures/bench/ID.json. */
export function readRefitCase(id: RefitCaseId): RefitCase {
  const path = join(projectFolder(), 'fixtures', 'bench', `${id}.json`);
  const file = JSON.parse(readFileSync(path, 'utf8')) as CaseFile;
  const dense = (shots: number[]) =>
    fitData({ kind: 'histogram', counts: shots.map((seen, n) => [n, seen]), lump: null }, file.trials);
  const { best } = file;
  return {
    id,
    trials: file.trials,
    observed: dense(file.histogram),
    resampled: (best && file.resampled?.map((shots, i) => ({ data: dense(shots), best: best[i] }))) ?? null
  };
}
