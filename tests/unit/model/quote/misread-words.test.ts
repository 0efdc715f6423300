import { withoutCounts } from '$lib/model/link/summary';
import { inNotation } from '$lib/model/quote/notation/notation';
import { NO_PROVENANCE } from '$lib/model/quote/provenance';
import { quoteOf } from '$lib/model/quote/quote-of';
import { diagnose } from '$lib/stats/diagnose';
import { defaultOptions } from '$lib/stats/default-options';
import type { Diagnosis } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Counts of kinks on ten bonds, invented. */
const counts: [number, number][] = [
  [0, 420],
  [1, 330],
  [2, 190],
  [3, 50],
  [4, 10]
];

const made = (over: Partial<typeof defaultOptions>): Promise<Diagnosis> =>
  diagnose(
    { kind: 'histogram', counts, lump: null },
    { ...defaultOptions, trials: 10, resamples: 99, ...over }
  );

const said = (document: Parameters<typeof quoteOf>[0]): string => {
  const { result, methods } = quoteOf(document, NO_PROVENANCE);
  return `${inNotation(result, 'plain')} ${inNotation(methods, 'plain')}`;
};

describe('what is quoted where a misread rate was stated', () => {
  it('names the misreads wherever the tests allow for them, and no law without them', async () => {
    const document = await made({ geometry: 'open-bonds', misread: 0.02 });
    expect(document.nuisances?.misread?.applied).toBe(true);
    for (const text of [said(document), said(withoutCounts(document))]) {
      expect(text).toContain('law, ceiling, bounds and tests are of independent kinks read with it');
      expect(text).toContain(
        'times the ceiling of independent trials with this mean, read with 2\u202f% of the'
      );
      for (const untrue of [
        'laws without misreads',
        'Poisson–binomial',
        'μ(1 − μ/N)',
        'drawn from equal trials'
      ])
        expect(text).not.toContain(untrue);
    }
    expect(said(document)).not.toContain('Clopper');
  });

  it('names the ring, its even total and the ceiling that was found', async () => {
    const even: [number, number][] = [
      [0, 520],
      [2, 400],
      [4, 80]
    ];
    const options = { ...defaultOptions, trials: 10, resamples: 99, geometry: 'ring-bonds' as const };
    const document = await diagnose(
      { kind: 'histogram', counts: even, lump: null },
      { ...options, misread: 0.02 }
    );
    expect(document.nuisances?.misread?.applied).toBe(true);
    for (const text of [said(document), said(withoutCounts(document))]) {
      expect(text).toContain(
        'independent kinks round a ring of N bonds, given that their number is even, read with'
      );
      expect(text).toContain(
        'the largest found for independent kinks round a ring with this mean, read with'
      );
      expect(text).not.toContain('open chain');
    }
  });

  it('says that the tests leave them out where they do', async () => {
    const text = said(await made({ geometry: 'ring-bonds', misread: 0.02 }));
    expect(text).toContain('the tests are against laws without misreads');
    expect(text).toContain('Poisson–binomial');
  });

  it('does not call misread sites a gap where they keep trials independent', async () => {
    const text = said(await made({ geometry: 'sites', misread: 0.02 }));
    expect(text).toContain('sites still give counts that are sums of independent trials');
    expect(text).not.toContain('laws without misreads');
  });
});
