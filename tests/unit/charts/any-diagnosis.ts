import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { CountData, Diagnosis, DiagnoseOptions, Histogram } from '$lib/stats/types';

/** A diagnosis for drawing: few resamples, since charts do not care how sharp a p-value is. */
export function anyDiagnosis(
  counts: [number, number][],
  options: Partial<DiagnoseOptions> = {},
  lump: Histogram['lump'] = null,
  below: Histogram['below'] = null
): Promise<Diagnosis> {
  const data: CountData = { kind: 'histogram', counts, lump, below };
  return diagnose(data, { ...defaultOptions, resamples: 19, ...options });
}

/** Weldon's dice, Pearson 1900, Phil. Mag. 50:157: dice that showed a five or a six, of twelve. */
export const WELDON: [number, number][] = [
  185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4
].map((shots, count) => [count, shots]);
