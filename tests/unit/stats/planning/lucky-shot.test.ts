import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { luckyShot } from '$lib/stats/planning/lucky-shot';
import type { Histogram } from '$lib/stats/types';

const nothing: Histogram = { kind: 'histogram', counts: [[0, 1]], lump: null };

describe('luckyShot', () => {
  it('is the sum over all cases, for any eight trials', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 0, max: 1, noNaN: true }), { minLength: 8, maxLength: 8 }),
        fc.integer({ min: 0, max: 8 }),
        (p, most) => {
          let sum = 0;
          for (let word = 0; word < 256; word++) {
            const bits = p.map((_, i) => (word >> i) & 1);
            if (bits.reduce((a, b) => a + b, 0) > most) continue;
            sum += bits.reduce((product, bit, i) => product * (bit ? p[i] : 1 - p[i]), 1);
          }
          const law = { levels: p.map((value) => ({ p: value, trials: 1 })), poissonPart: 0 };
          const found = luckyShot(law, nothing, most);
          expect(Math.abs(found.exact - sum)).toBeLessThanOrEqual(1e-12 * Math.max(sum, 1e-280) + 1e-16);
          expect(found.chernoff).toBeGreaterThanOrEqual(found.exact * (1 - 1e-10));
        }
      ),
      { seed: 3 }
    );
  });

  it('of no defect at all among forty trials of 0.12: once in 166 shots', () => {
    const law = { levels: [{ p: 0.12, trials: 40 }], poissonPart: 0 };
    const seen: Histogram = { kind: 'histogram', counts: [[1, 10]], lump: null };
    const found = luckyShot(law, seen, 0);
    // 0.88^40 by hand: e^{40 ln 0.88} = e^{−5.11333}.
    expect(found.exact).toBeCloseTo(0.88 ** 40, 14);
    expect(found.shotsUntil).toBeCloseTo(166.2, 0);
    // Clopper–Pearson 0 of 10: 0 to 0.308497.
    expect(found.observed).toMatchObject({ shots: 0, share: 0, low: 0 });
    expect(found.observed!.high).toBeCloseTo(0.308497, 6);
  });

  it('says nothing of what a lump hides', () => {
    const lumped: Histogram = { kind: 'histogram', counts: [[0, 5]], lump: { from: 1, shots: 5 } };
    const law = { levels: [{ p: 0.5, trials: 4 }], poissonPart: 0 };
    expect(luckyShot(law, lumped, 1).observed).toBeNull();
    expect(luckyShot(law, lumped, 0).observed!.share).toBe(0.5);
  });

  it('without a histogram, of equal trials: no independent trials of that mean pass it below mean − 1', () => {
    const mean = 4;
    const equal = luckyShot({ levels: [{ p: mean / 10, trials: 10 }], poissonPart: 0 }, null, 2);
    expect(equal.observed).toBeNull();
    // Bin(10, 0.4), P(X ≤ 2) = 0.1673 (binomial tables).
    expect(equal.exact).toBeCloseTo(0.1673, 4);
    for (const spread of [0.1, 0.2, 0.4]) {
      const levels = [
        { p: 0.4 - spread, trials: 5 },
        { p: 0.4 + spread, trials: 5 }
      ];
      expect(luckyShot({ levels, poissonPart: 0 }, null, 2).exact).toBeLessThan(equal.exact);
    }
  });

  it('holds far out: 1000 trials of 0.5, none at all', () => {
    const { exact, chernoff, shotsUntil } = luckyShot(
      { levels: [{ p: 0.5, trials: 1000 }], poissonPart: 0 },
      null,
      0
    );
    // 2^−1000, which doubles hold exactly.
    expect(exact / 2 ** -1000).toBeCloseTo(1, 10);
    expect(chernoff / 2 ** -1000).toBeCloseTo(1, 9);
    expect(shotsUntil! / 2 ** 1000).toBeCloseTo(1, 10);
  });
});
