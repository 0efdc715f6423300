import { readFileSync } from 'node:fs';

export interface RefitCase {
  trials: number;
  shots: number;
  observed: number[];
  refits: { shots: number[]; known: number; scipy: number; best: number }[];
}

/** Resampled histograms and the best log-likelihood known for each: fixtures/reference/refits.py. */
export const refitCases = (
  JSON.parse(
    readFileSync(new URL('../../../../fixtures/reference/refits.json', import.meta.url), 'utf8')
  ) as { cases: Record<'weldon12' | 'lz32', RefitCase> }
).cases;
