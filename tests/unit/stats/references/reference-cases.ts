import type { FitData } from '$lib/stats/fit/fit-data';
import { readFileSync } from 'node:fs';
import { dataOf } from '../fit/plain';

export interface ReferenceCase {
  name: string;
  shots: number[];
  trials: number | null;
  lump: { from: number; shots: number } | null;
  mean: number;
  variance: number;
  equal?: { p: number; logLikelihood: number };
  rare: { mean: number; logLikelihood: number };
  gaussian: number;
  landauZener?: { a: number; logLikelihood: number };
}

/** SciPy values: fixtures/reference/references.py. */
export const referenceCases = (
  JSON.parse(
    readFileSync(new URL('../../../../fixtures/reference/references.json', import.meta.url), 'utf8')
  ) as { cases: ReferenceCase[] }
).cases;

export function dataOfCase({ shots, trials, lump }: ReferenceCase): FitData {
  return dataOf({ shots, trials, lump });
}

/** |got/want − 1|. */
export function relative(got: number, want: number): number {
  return Math.abs(got / want - 1);
}
