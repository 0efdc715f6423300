import { reachableThird } from '$lib/stats/bounds/reachable-third';
import { reachesBody } from '$lib/stats/bounds/reaches-body';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const ends = (min: number, max: number) =>
  fc
    .tuple(fc.double({ min, max, noNaN: true }), fc.double({ min: 0, max: 0.6, noNaN: true }))
    .map(([low, width]) => ({ low, high: low + width }));

describe('reachesBody', () => {
  it('agrees with trying 4000 values of κ2/κ1 one by one', () => {
    fc.assert(
      fc.property(
        ends(-0.2, 1.3),
        ends(-0.5, 1.3),
        fc.double({ min: 0, max: 0.9, noNaN: true }),
        (fano, third, share) => {
          let least = Infinity;
          for (let i = 0; i <= 4000; i++) {
            const f = fano.low + ((fano.high - fano.low) * i) / 4000;
            const edges = reachableThird(f, share);
            if (edges) least = Math.min(least, Math.max(edges.low - third.high, third.low - edges.high));
          }
          // Rectangles that touch by less than the net can see are left to either answer.
          fc.pre(Math.abs(least) > 1e-3 || least === Infinity);
          fc.pre(least !== Infinity || Math.abs(fano.low - (1 - share)) > 1e-3);
          expect(reachesBody(fano, third, share)).toBe(least < 0);
        }
      ),
      { numRuns: 500 }
    );
  });

  it('takes an open end for no limit', () => {
    expect(reachesBody({ low: 0.4, high: 0.5 }, { low: null, high: null }, 0.2)).toBe(true);
    expect(reachesBody({ low: 0.9, high: null }, { low: null, high: null }, 0.2)).toBe(false);
    expect(reachesBody({ low: null, high: null }, { low: null, high: -0.2 }, 0)).toBe(false);
    expect(reachesBody({ low: null, high: null }, { low: 1.01, high: null }, 0)).toBe(false);
  });
});
