import { sayLaw } from '$lib/model/plain-text/say-law';
import { howBig } from '$lib/model/report/how-big';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { describe, expect, it } from 'vitest';

describe('how many shots make a distance noticeable', () => {
  it('is told of one as of one', async () => {
    const counts: [number, number][] = [
      [0, 50],
      [40, 50]
    ];
    const document = await diagnose(
      { kind: 'histogram', counts, lump: null },
      { ...defaultOptions, trials: 100, resamples: 19 }
    );
    const said = (shotsToNotice: number) => {
      const told = { ...document, fit: { ...document.fit, shotsToNotice } };
      return [howBig(told).at(-1), sayLaw(told).replace(/\s+/g, ' ')];
    };
    for (const text of said(1)) expect(text).toContain('About 1 shot makes ');
    for (const text of said(12)) expect(text).toContain('About 12 shots make ');
  });
});
