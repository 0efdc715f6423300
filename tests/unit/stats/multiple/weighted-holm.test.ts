import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { holm } from '$lib/stats/multiple/holm';
import { weightedHolm } from '$lib/stats/multiple/weighted-holm';

describe("Holm's procedure with weights", () => {
  it('is his own where weights are equal', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { maxLength: 20 }), (p) => {
        weightedHolm(p, new Array(p.length).fill(0.25)).forEach((value, i) =>
          expect(value).toBeCloseTo(holm(p)[i], 12)
        );
      })
    );
  });

  it('rejects what the step-down rule rejects, worked by hand', () => {
    // p/w = 0.02, 0.05, 0.1; what is left of the weights: 1, 0.5, 0.2.
    const adjusted = weightedHolm([0.01, 0.02, 0.015], [0.5, 0.2, 0.3]);
    [0.02, 0.025, 0.025].forEach((value, i) => expect(adjusted[i]).toBeCloseTo(value, 12));
  });

  it('refuses weights that are none', () => {
    expect(() => weightedHolm([0.1], [0])).toThrow(RangeError);
    expect(() => weightedHolm([0.1], [])).toThrow(RangeError);
  });
});
