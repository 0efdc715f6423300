import { describe, expect, it } from 'vitest';
import type { Effect } from '$lib/stats/planning/effect';
import { powerCurve } from '$lib/stats/planning/power-curve';
import { shotsToSee } from '$lib/stats/planning/shots-to-see';
import { simulatePower } from '$lib/stats/planning/simulate-power';
import { smallestEffect } from '$lib/stats/planning/smallest-effect';

const usual = { alpha: 0.05, power: 0.8 };
const GRID: [Effect['kind'], size: number, mean: number, trials: number | null][] = [
  ['excess', 0.1, 4, null],
  ['excess', 0.4, 4, null],
  ['excess', 0.05, 0.5, null],
  ['excess', 0.12, 4.8, 32],
  ['excess', 0.2, 0.5, 20],
  ['excess', 0.08, 0.2, 20],
  ['pairs', 0.004, 9.6, 64],
  ['pairs', 0.03, 2, 12],
  ['neighbours', 0.05, 4.8, 48],
  ['neighbours', 0.15, 10, 100],
  ['neighbours', 0.1, 1, 20],
  ['misread', 0.01, 4, 50],
  ['misread', 0.002, 5, 100],
  ['misread', 0.05, 10, 40]
];

describe('shotsToSee', () => {
  it('is near (1.645 + 0.842)²·2/excess² for a small excess of a Poisson law', () => {
    // 2.486475 = 1.644854 + 0.841621 (tables of the normal law); shape 2 under independence, a little more with the
    // excess. 2·2.486475²/0.02² = 30 914.
    const { shots } = shotsToSee({ kind: 'excess', size: 0.02, mean: 3, trials: null }, usual)!;
    expect(shots! / ((2 * 2.486475 ** 2) / 0.02 ** 2)).toBeCloseTo(1, 1);
  });

  it('says the excess that each effect makes, by its own formula', () => {
    const excess = (kind: Effect['kind'], size: number, mean: number, trials: number | null) =>
      shotsToSee({ kind, size, mean, trials }, usual)!.excess;
    expect(excess('excess', 0.25, 3, 12)).toBeCloseTo(0.25, 10);
    expect(excess('excess', 0.25, 3, null)).toBeCloseTo(0.25, 10);
    // 1 + (N − 1)ρ.
    expect(excess('pairs', 0.01, 3, 12)).toBeCloseTo(0.11, 10);
    // (2/N)·Σ (N − d)c^d: N = 3, c = ½: (2/3)(2·½ + ¼) = 5/6.
    expect(excess('neighbours', 0.5, 1, 3)).toBeCloseTo(5 / 6, 10);
    // Open chain: 2(N−1)/(4N)·m²u²(1−u²) over ρ(1−ρ), ρ the share as read; N = 50, p = 0.05, ε = 0.01 give 1.239 times
    // the naive ceiling of the true share (science of misreads); of the share as read, 0.05 + 2·0.01·0.99·0.9 = 0.06782:
    const [m, u] = [0.9, 0.98];
    const read = 0.06782;
    const variance = 0.25 * (50 * (1 - m ** 2 * u ** 4) + 98 * m ** 2 * u ** 2 * (1 - u ** 2));
    expect(excess('misread', 0.01, 50 * read, 50)).toBeCloseTo(variance / (50 * read * (1 - read)) - 1, 10);
  });

  it('says where its formula is rough: 24 shots with 7 defects between them', () => {
    const few = shotsToSee({ kind: 'excess', size: 1, mean: 0.3, trials: 20 }, { alpha: 0.05, power: 0.6 })!;
    expect(few.rough).toBe(true);
    expect(shotsToSee({ kind: 'excess', size: 0.1, mean: 4, trials: 20 }, usual)!.rough).toBe(false);
  });

  it('refuses what has no meaning', () => {
    expect(shotsToSee({ kind: 'excess', size: 0.1, mean: 0, trials: 10 }, usual)).toBeNull();
    expect(shotsToSee({ kind: 'excess', size: 0, mean: 4, trials: 10 }, usual)).toBeNull();
    expect(shotsToSee({ kind: 'excess', size: 0.1, mean: 11, trials: 10 }, usual)).toBeNull();
    expect(shotsToSee({ kind: 'pairs', size: 0.1, mean: 1, trials: null }, usual)).toBeNull();
    // Misreads of 10 % alone make 0.18 of the bonds look like kinks.
    expect(shotsToSee({ kind: 'misread', size: 0.1, mean: 1, trials: 50 }, usual)).toBeNull();
    const some: Effect = { kind: 'excess', size: 0.1, mean: 4, trials: 10 };
    expect(shotsToSee(some, { alpha: 0.05, power: 0.04 })).toBeNull();
    expect(shotsToSee(some, { alpha: 0.5, power: 0.8 })).toBeNull();
  });

  describe.each([
    [0.05, 0.8],
    [0.01, 0.9],
    [0.05, 0.6]
  ])('at α = %d and power %d', (alpha, power) => {
    it.each(GRID)(
      '%s of %d, mean %d of %d, is seen so often on simulated shots',
      (kind, size, mean, trials) => {
        const effect = { kind, size, mean, trials };
        const { shots, rough } = shotsToSee(effect, { alpha, power })!;
        const tried = simulatePower(effect, shots!, alpha, { without: 8000, with: 1500 }, 8)!;
        expect(rough).toBe(false);
        // Five points, and what the 1500 experiments themselves leave open (sd 1.3 points at most).
        expect(Math.abs(tried.share - power), `${shots} shots: ${tried.share}`).toBeLessThan(0.05);
      }
    );
  });
});

describe('powerCurve', () => {
  it('rises to the power asked for at the shots that are needed', () => {
    const effect: Effect = { kind: 'excess', size: 0.1, mean: 4, trials: 50 };
    const { shots, power } = shotsToSee(effect, usual)!;
    const curve = powerCurve(effect, usual.alpha, shots!, 40);
    expect(curve[0][0]).toBe(20);
    expect(curve[40]).toEqual([shots, power]);
    for (let i = 1; i <= 40; i++) expect(curve[i][1]).toBeGreaterThan(curve[i - 1][1]);
    expect(powerCurve({ ...effect, size: 60 }, usual.alpha, 1000)).toEqual([]);
  });
});

describe('smallestEffect', () => {
  it.each(GRID)('takes back the shots for %s of %d', (kind, size, mean, trials) => {
    const { shots } = shotsToSee({ kind, size, mean, trials }, usual)!;
    const back = smallestEffect({ kind, mean, trials }, shots!, usual)!;
    // A whole number of shots sees a little less than asked, most so when they are few.
    expect(back).toBeLessThanOrEqual(size * 1.0002);
    expect(back).toBeGreaterThan(size * (1 - 1 / shots!));
  });

  it('says when nothing is seen', () => {
    expect(smallestEffect({ kind: 'misread', mean: 1, trials: 100 }, 20, usual)).toBeNull();
    expect(smallestEffect({ kind: 'pairs', mean: 1, trials: null }, 2000, usual)).toBeNull();
  });
});
