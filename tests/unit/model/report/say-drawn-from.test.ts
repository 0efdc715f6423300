import { sayDrawnFrom } from '$lib/model/report/say-drawn-from';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import type { DiagnoseOptions, Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Equal trials, which no fit tells from the best law. */
function equal(from: number): Histogram {
  const random = generator(1, 0);
  const seen = new Map<number, number>();
  for (let i = 0; i < 400; i++) {
    const n = binomialSample(random, 20, 0.2);
    if (n >= from) seen.set(n, (seen.get(n) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

const said = async (from: number, options: Partial<DiagnoseOptions>) =>
  sayDrawnFrom(await diagnose(equal(from), { ...defaultOptions, trials: 20, resamples: 19, ...options }));

describe('what resamples were drawn from', () => {
  it('is the fitted law, where the account of the fit names no other', async () => {
    expect(await said(0, {})).toMatch(/other tests from the fitted law, each histogram fitted again\.$/);
  });

  it.each([
    [
      'equal bonds, with misreads',
      0,
      { misread: 0.001, geometry: 'open-bonds' },
      /Equal bonds fit about as well/
    ],
    ['equal trials so cut', 1, { kept: { from: 1, to: null } }, /Equal trials so cut fit about as well/]
  ] as [string, number, Partial<DiagnoseOptions>, RegExp][])(
    'is told in the words of the document: %s',
    async (_, from, options, words) => {
      const told = await said(from, options);
      expect(told).toMatch(words);
      expect(told).toMatch(/were drawn from them\.$/);
      expect(told).not.toMatch(/the fitted law/);
    }
  );
});
