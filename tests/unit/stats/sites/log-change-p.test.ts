import { generator } from '$lib/stats/random/generator';
import { logChangeP, type PairTable } from '$lib/stats/sites/log-change-p';
import { describe, expect, it } from 'vitest';

/** Whole numbers, so that brute force shares nothing with the function but the law. */
function choose(n: number, k: number): bigint {
  if (k < 0 || k > n) return 0n;
  let value = 1n;
  for (let i = 1; i <= k; i++) value = (value * BigInt(n - k + i)) / BigInt(i);
  return value;
}

function bruteForce(earlier: PairTable, later: PairTable, seek: 'any' | 'rise'): number {
  const weight = (of: PairTable, k: number) =>
    choose(of.first, k) * choose(of.shots - of.first, of.second - k);
  const total = earlier.both + later.both;
  let [all, tail] = [0n, 0n];
  const observed = weight(later, later.both) * weight(earlier, earlier.both);
  for (let k = 0; k <= total; k++) {
    const one = weight(later, k) * weight(earlier, total - k);
    all += one;
    if (seek === 'rise' ? k >= later.both : one <= observed) tail += one;
  }
  return Number((tail * 10n ** 18n) / all) / 1e18;
}

/** Both sites of a rate, with a correlation, drawn shot by shot. */
function draw(seed: number, run: number, shots: number, rate: number, correlation: number): PairTable {
  const random = generator(seed, run);
  const both = rate * rate + correlation * rate * (1 - rate);
  const table = { both: 0, first: 0, second: 0, shots };
  for (let shot = 0; shot < shots; shot++) {
    const at = random.next();
    if (at < both) table.both += 1;
    if (at < rate) table.first += 1;
    if (at < both || (at >= rate && at < 2 * rate - both)) table.second += 1;
  }
  return table;
}

describe('the exact test of a change of a pair', () => {
  it.each<[PairTable, PairTable]>([
    [
      { both: 2, first: 9, second: 7, shots: 30 },
      { both: 6, first: 8, second: 9, shots: 25 }
    ],
    [
      { both: 0, first: 5, second: 6, shots: 20 },
      { both: 1, first: 4, second: 5, shots: 40 }
    ],
    [
      { both: 12, first: 30, second: 25, shots: 60 },
      { both: 25, first: 30, second: 40, shots: 60 }
    ],
    [
      { both: 0, first: 0, second: 6, shots: 20 },
      { both: 2, first: 4, second: 5, shots: 20 }
    ],
    [
      { both: 20, first: 20, second: 20, shots: 20 },
      { both: 2, first: 4, second: 5, shots: 20 }
    ]
  ])('agrees with whole numbers', (earlier, later) => {
    for (const seek of ['any', 'rise'] as const)
      expect(Math.exp(logChangeP(earlier, later, seek))).toBeCloseTo(bruteForce(earlier, later, seek), 10);
  });

  it('does not depend on which map came first but for a rise', () => {
    const [a, b] = [
      { both: 2, first: 9, second: 7, shots: 30 },
      { both: 6, first: 8, second: 9, shots: 25 }
    ];
    expect(logChangeP(a, b, 'any')).toBeCloseTo(logChangeP(b, a, 'any'), 12);
    expect(logChangeP(a, b, 'rise')).toBeLessThan(logChangeP(b, a, 'rise'));
  });

  it('keeps its digits where p is far below the smallest double', () => {
    const log = logChangeP(
      { both: 400, first: 2000, second: 2000, shots: 1e4 },
      { both: 2000, first: 2000, second: 2000, shots: 1e4 },
      'rise'
    );
    expect(log).toBeLessThan(-800);
    expect(Number.isFinite(log)).toBe(true);
  });

  it.each([
    [0.2, 0.3, 0],
    [0.1, 0.1, 0],
    [0.2, 0.2, 0.15]
  ])(
    'keeps its level where rates are %d and %d and both maps have correlation %d',
    (before, after, correlation) => {
      const runs = 3000;
      let found = 0;
      for (let run = 0; run < runs; run++)
        if (
          logChangeP(
            draw(71, run, 300, before, correlation),
            draw(72, run, 200, after, correlation),
            'any'
          ) <= Math.log(0.05)
        )
          found += 1;
      // Three standard errors of 5 % in 3000 runs; below it is allowed, the test is exact and steps are coarse.
      expect(found / runs).toBeLessThan(0.05 + 3 * Math.sqrt((0.05 * 0.95) / runs));
      expect(found).toBeGreaterThan(0.02 * runs);
    }
  );
});
