import { diagnosisSchema } from '$lib/model/diagnosis-schema';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { describe, expect, it } from 'vitest';
import { readKinks } from '../stats/misread/read-kinks';

describe('diagnosisSchema', () => {
  it('takes a document with its nuisances, applied or not, and refuses what is not one', async () => {
    const data = readKinks(6, 20, 0.1, 0.02, 300);
    for (const misread of [null, 0.02]) {
      const options = {
        ...defaultOptions,
        trials: 20,
        geometry: 'open-bonds' as const,
        misread,
        resamples: 19
      };
      const found = await diagnose(data, options);
      expect(found.nuisances!.misread.applied).toBe(misread !== null);
      expect(diagnosisSchema.parse(JSON.parse(JSON.stringify(found)))).toEqual(found);
      expect(diagnosisSchema.safeParse({ ...found, nuisances: { misread: 3 } }).success).toBe(false);
    }
  });
});
