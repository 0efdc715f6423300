import { describe, expect, it } from 'vitest';
import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { lawWindow } from '$lib/stats/laws/law-window';
import { generator } from '$lib/stats/random/generator';
import { redraw } from '$lib/stats/resampling/redraw';
import { refitted, type Buffers, type Refitted } from '$lib/stats/resampling/refitted';

const law = {
  levels: [
    { p: 0.4, trials: 3 },
    { p: 0.1, trials: 20 }
  ],
  poissonPart: 0
};
const like = fitData({ kind: 'histogram', counts: [[0, 1]], lump: { from: 9, shots: 1 } }, 23);
const source = redraw(lawWindow(law, 1e-18, 1), like, 400);
const resamples = Array.from({ length: 30 }, (_, b) => source.draw(generator(5, b)));
const { levels } = bestLaw(resamples[0]);

function told({ fit, divergence, rest }: Refitted) {
  const aside = rest();
  return {
    fit: { ...fit, window: [fit.window.first, ...fit.window.values] },
    divergence,
    rest: aside && [aside.fit.logLikelihood, aside.fit.window.first, ...aside.fit.window.values]
  };
}

describe('refitted', () => {
  it('says the same with the buffers of the resample before as with fresh ones', () => {
    const buffers: Buffers = {};
    for (const data of resamples) {
      expect(told(refitted(data, levels, undefined, buffers))).toEqual(told(refitted(data, levels)));
    }
    // Lengths differ and lumps come and go, or this would show nothing.
    expect(new Set(resamples.map(({ shots }) => shots.length)).size).toBeGreaterThan(1);
    expect(new Set(resamples.map(({ lump }) => lump === null)).size).toBe(2);
  });

  it('takes buffers over instead of making them', () => {
    const buffers: Buffers = {};
    refitted(resamples[0], levels, undefined, buffers).rest();
    const { whole, rest } = buffers;
    refitted(resamples[1], levels, undefined, buffers).rest();
    expect(buffers.whole).toBe(whole);
    expect(buffers.rest).toBe(rest);
    expect(whole).not.toBe(rest);
  });

  it('keeps the first answer when it is asked again for the others', () => {
    const one = refitted(resamples[0], levels);
    expect(one.rest()).toBe(one.rest());
    expect(one.rest()!.data.total).toBe(400 - resamples[0].shots[0]);
  });
});
