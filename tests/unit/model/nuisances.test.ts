import { documentCsv } from '$lib/model/document-csv';
import { withoutCounts } from '$lib/model/link/summary';
import { sayNuisances } from '$lib/model/report/say-nuisances';
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
      expect(found.nuisances!.misread!.applied).toBe(misread !== null);
      expect(diagnosisSchema.parse(JSON.parse(JSON.stringify(found)))).toEqual(found);
      expect(diagnosisSchema.safeParse({ ...found, nuisances: { misread: 3 } }).success).toBe(false);
    }
  });
});

describe('drift in the document', () => {
  const list = {
    kind: 'shots' as const,
    shots: Array.from({ length: 400 }, (_, i) => ((i * 7) % 5) + (i < 200 ? 0 : 5)),
    batches: Array.from({ length: 400 }, (_, i) => `Ann’s run ${Math.floor(i / 100)}`)
  };
  it('is taken by the schema, told in words, and names no batch', async () => {
    const found = await diagnose(list, { ...defaultOptions, trials: 40, resamples: 99 });
    expect(diagnosisSchema.parse(JSON.parse(JSON.stringify(found)))).toEqual(found);
    const said = new Map(sayNuisances(found, null));
    expect(said.get('Within batches')).toContain(found.nuisances!.drift!.statement);
    expect(said.get('Change of the mean')).toMatch(/at shot 201: mean 2(\.\d+)? before, 7(\.\d+)? from/);
    expect(documentCsv(found)).toMatch(/\r\nbatches,excessBetween,,\d/);
    expect(JSON.stringify(found)).not.toContain('Ann');
    expect(JSON.stringify(withoutCounts(found))).not.toContain('meansVariance');
  });
});
