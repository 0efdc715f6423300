import { poissonIsApart } from '$lib/model/report/poisson-is-apart';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { describe, expect, it } from 'vitest';

describe('the Poisson law among the other laws', () => {
  it.each([
    [100, true],
    [null, false]
  ])('with N = %s stands apart: %s', async (trials, apart) => {
    const counts: [number, number][] = [
      [0, 30],
      [1, 50],
      [2, 20]
    ];
    const options = { ...defaultOptions, trials, resamples: 19 };
    const document = await diagnose({ kind: 'histogram', counts, lump: null }, options);
    expect(document.fit.references.map(({ id }) => id)).toContain('rare-events');
    expect(poissonIsApart(document)).toBe(apart);
  });
});
