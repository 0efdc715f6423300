import { shotsForExcess, smallestExcess, varianceShape } from '$lib/stats/answer/smallest-excess';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { generator } from '$lib/stats/random/generator';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const anyN = fc.option(fc.integer({ min: 1, max: 400 }));

describe('varianceShape', () => {
  it('is 2 + κ4/κ2² of equal trials, of a Poisson law for unknown N', () => {
    fc.assert(
      fc.property(anyN, fc.double({ min: 0.001, max: 0.999, noNaN: true }), (trials, share) => {
        const mean = share * (trials ?? 20);
        const levels = trials === null ? [] : [{ p: mean / trials, trials }];
        const { variance, fourth } = lawMoments({ levels, poissonPart: trials === null ? mean : 0 });
        expect(varianceShape(mean, trials)! / (2 + fourth / variance ** 2)).toBeCloseTo(1, 9);
      })
    );
  });

  it('is S times the relative variance of a sample variance, by simulation', () => {
    const shots = 400;
    const squares: number[] = [];
    for (let repeat = 0; repeat < 2000; repeat++) {
      const random = generator(5, repeat);
      let [sum, square] = [0, 0];
      for (let s = 0; s < shots; s++) {
        const n = binomialSample(random, 12, 0.3);
        sum += n;
        square += n * n;
      }
      squares.push((square - (sum * sum) / shots) / (shots - 1));
    }
    const mean = squares.reduce((a, b) => a + b) / 2000;
    const spread = squares.reduce((a, b) => a + (b - mean) ** 2, 0) / 1999;
    // 2000 repeats give a variance to 3 %; four of those.
    expect(Math.abs((shots * spread) / mean ** 2 / varianceShape(3.6, 12)! - 1)).toBeLessThan(0.13);
  });

  it('is null where the ceiling is 0', () => {
    expect([varianceShape(0, 5), varianceShape(5, 5), varianceShape(0, null)]).toEqual([null, null, null]);
  });
});

describe('smallestExcess', () => {
  it('is about 2.49·√((2 + κ4/κ2²)/S) of the ceiling', () => {
    // Poisson, mean 1: κ4/κ2² = 1, so 2.49·√(3/300).
    expect(smallestExcess(1, null, 300)).toBeCloseTo(0.249, 12);
    expect(smallestExcess(0, 5, 100)).toBeNull();
  });

  it('is undone by shotsForExcess', () => {
    fc.assert(
      fc.property(anyN, fc.integer({ min: 10, max: 1_000_000 }), (trials, shots) => {
        const mean = 0.3 * (trials ?? 20);
        const excess = smallestExcess(mean, trials, shots)!;
        expect(Math.abs(shotsForExcess(mean, trials, excess)! - shots)).toBeLessThanOrEqual(1);
      })
    );
  });
});
