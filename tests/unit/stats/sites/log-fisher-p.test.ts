import { describe, expect, it } from 'vitest';
import { logFisherP } from '$lib/stats/sites/log-fisher-p';

describe("Fisher's exact test", () => {
  // scipy.stats.fisher_exact, SciPy 1.17.1, two-sided, on [[a, b], [c, d]].
  it.each([
    [3, 1, 1, 3, 0.48571428571428565],
    [8, 2, 1, 5, 0.034965034965034975],
    [0, 5, 5, 10, 0.2663183694530444],
    [12, 5, 7, 0, 0.272068511198946],
    [1, 24, 47, 4928, 0.21474197867052522],
    [30, 220, 220, 4530, 6.928954874318196e-6],
    [100, 200, 300, 4400, 8.553237901395774e-40],
    [1250, 1250, 1250, 1250, 1]
  ])('agrees with SciPy for %d %d %d %d', (a, b, c, d, p) => {
    expect(Math.exp(logFisherP(a, a + b, a + c, a + b + c + d)) / p).toBeCloseTo(1, 9);
  });

  it('agrees with all tables written out in whole numbers, up to 14 shots', () => {
    const choose = (n: number, k: number): number =>
      k < 0 || k > n ? 0 : k === 0 ? 1 : (choose(n, k - 1) * (n - k + 1)) / k;
    for (let shots = 1; shots <= 14; shots++) {
      for (let a = 0; a <= shots; a++) {
        for (let b = 0; b <= shots; b++) {
          const ways = Array.from({ length: shots + 1 }, (_, k) => choose(a, k) * choose(shots - a, b - k));
          ways.forEach((own, both) => {
            if (own === 0) return;
            const p = ways.filter((other) => other <= own).reduce((x, y) => x + y) / choose(shots, b);
            expect(Math.exp(logFisherP(both, a, b, shots))).toBeCloseTo(p, 11);
          });
        }
      }
    }
  });

  it('keeps its digits where p is no double: two columns alike have p = 1/C(S, k)', () => {
    // ln C(5000, 2000) = ln 5000! − ln 2000! − ln 3000!, summed here term by term.
    let log = 0;
    for (let k = 1; k <= 2000; k++) log += Math.log((3000 + k) / k);
    expect(logFisherP(2000, 2000, 2000, 5000) / -log).toBeCloseTo(1, 10);
  });

  it('gives 1 for a site that never or always reads 1', () => {
    expect(logFisherP(0, 0, 40, 100)).toBe(0);
    expect(logFisherP(40, 100, 40, 100)).toBe(0);
  });
});
