import { tailsTitle } from '$lib/charts/tails-title';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { Diagnosis, Unit } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';

describe('title of the tails', () => {
  let document: Diagnosis;
  beforeAll(async () => {
    // Half the shots hold nothing and half hold 40 of 100: no independent trials do that.
    const counts: [number, number][] = [
      [0, 500],
      [40, 500]
    ];
    const options = { ...defaultOptions, trials: 100, resamples: 19 };
    document = await diagnose({ kind: 'histogram', counts, lump: null }, options);
  });

  it.each([
    [0, 'low', 'defect', 'no defects'],
    [1, 'low', 'defect', '1 defect or fewer'],
    [1, 'high', 'pair', '1 pair or more'],
    [12, 'high', 'defect', '12 defects or more']
  ] as [number, 'low' | 'high', Unit, string][])('tells of %i, %s, %s', (count, side, unit, words) => {
    const { certificate } = document.tails;
    if (!certificate) throw new Error('such counts have a certificate');
    expect(certificate.p).toBeLessThan(document.engine.alpha);
    const tails = { ...document.tails, certificate: { ...certificate, count, side } };
    expect(tailsTitle({ ...document, tails, data: { ...document.data, unit } })).toBe(
      `Too many shots with ${words} for any independent trials`
    );
  });
});
