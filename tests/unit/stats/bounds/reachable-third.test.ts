import { momentBody } from '$lib/stats/bounds/moment-body';
import { reachableThird } from '$lib/stats/bounds/reachable-third';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

/** κ1 … κ3 of trials straight from their definition, Σp, Σp(1−p), Σp(1−p)(1−2p). */
function cumulants(p: number[], poissonPart = 0): [number, number, number] {
  return p.reduce<[number, number, number]>(
    ([k1, k2, k3], q) => [k1 + q, k2 + q * (1 - q), k3 + q * (1 - q) * (1 - 2 * q)],
    [poissonPart, poissonPart, poissonPart]
  );
}

const share = fc.oneof(fc.double({ min: 0, max: 1, noNaN: true }), fc.constantFrom(0, 1, 0.5));

describe('reachableThird', () => {
  it('holds every list of probabilities, with N and without', () => {
    fc.assert(
      fc.property(
        fc.array(share, { minLength: 1, maxLength: 12 }),
        fc.double({ min: 0, max: 5, noNaN: true }),
        (p, poissonPart) => {
          for (const [part, trials] of [
            [0, p.length],
            [poissonPart, Infinity]
          ]) {
            const [k1, k2, k3] = cumulants(p, part);
            fc.pre(k1 > 1e-6 && k1 < trials);
            const edges = reachableThird(k2 / k1, k1 / trials);
            expect(edges).not.toBeNull();
            expect(k3 / k1).toBeGreaterThanOrEqual(edges!.low - 1e-9);
            expect(k3 / k1).toBeLessThanOrEqual(edges!.high + 1e-9);
          }
        }
      ),
      { numRuns: 1000 }
    );
  });

  it.each([1, 3, 7, 12])('is reached from below by %i equal trials of 12, the rest at 0', (equal) => {
    for (const p of [0.05, 0.3, 0.5, 0.8]) {
      const [k1, k2, k3] = cumulants(Array.from({ length: 12 }, (_, i) => (i < equal ? p : 0)));
      expect(reachableThird(k2 / k1, k1 / 12)!.low).toBeCloseTo(k3 / k1, 12);
    }
  });

  it.each([0, 1, 5, 11])('is reached from above by equal trials of 12, %i of them at 1', (certain) => {
    for (const p of [0.05, 0.3, 0.5, 0.8]) {
      const [k1, k2, k3] = cumulants(Array.from({ length: 12 }, (_, i) => (i < certain ? 1 : p)));
      expect(reachableThird(k2 / k1, k1 / 12)!.high).toBeCloseTo(k3 / k1, 12);
    }
  });

  it('is reached from above by a Poisson part and trials at 1 when N is unknown', () => {
    const [k1, k2, k3] = cumulants([1, 1], 3);
    expect(reachableThird(k2 / k1, 0)!.high).toBeCloseTo(k3 / k1, 12);
  });

  it('is nearly filled by brute force: every corner of a fine net of the region has trials near it', () => {
    // 40 trials of three kinds, 0, 1 and p: measures of mass 40 whose mean is 8, so m = 0.2.
    const near: [number, number][] = [];
    for (let certain = 0; certain <= 7; certain++)
      for (let some = 8 - certain; some <= 40 - certain; some++) {
        const p = (8 - certain) / some;
        const [k1, k2, k3] = cumulants([
          ...Array.from({ length: certain }, () => 1),
          ...Array.from({ length: some }, () => p)
        ]);
        near.push([k2 / k1, k3 / k1]);
      }
    for (let fano = 0.05; fano <= 0.8; fano += 0.05) {
      const { low, high } = reachableThird(fano, 0.2)!;
      for (const third of [low, high])
        expect(
          Math.min(...near.map(([x, y]) => Math.hypot(x - fano, y - third))),
          `${fano}, ${third}`
        ).toBeLessThan(0.06);
    }
  });

  it('gives the limits of momentBody, divided by the mean', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 11.5, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (mean, part) => {
          const fano = part * (1 - mean / 12);
          const [, floor, roof] = momentBody(12, { mean, variance: fano * mean, third: 0 });
          const edges = reachableThird(fano, mean / 12)!;
          expect(edges.low).toBeCloseTo(floor.limit / mean, 9);
          expect(edges.high).toBeCloseTo(roof.limit / mean, 9);
        }
      )
    );
  });

  it('has no answer where no trials have this variance', () => {
    expect(reachableThird(0.9, 0.2)).toBeNull();
    expect(reachableThird(-0.1, 0)).toBeNull();
    expect(reachableThird(NaN, 0)).toBeNull();
    expect(reachableThird(1, 0)).toEqual({ low: 1, high: 1 });
  });
});
