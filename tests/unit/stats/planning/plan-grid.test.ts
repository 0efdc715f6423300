import { planGrid } from '$lib/stats/calibration/plan-grid';
import { tryPlan } from '$lib/stats/calibration/try-plan';
import { binomialRange } from '$lib/stats/planning/binomial-range';
import { repeatsFor } from '$lib/stats/planning/repeats-for';
import { simulatePower } from '$lib/stats/planning/simulate-power';
import type { Effect } from '$lib/stats/planning/effect';
import { describe, expect, it } from 'vitest';

describe('plans of the grid', () => {
  // Every ninth plan at the usual levels, every eighteenth at 0.001, where a check takes 200 000 experiments.
  const some = planGrid().filter(({ alpha }, i) => i % (alpha < 0.01 ? 18 : 9) === 4);
  it('have the power they ask for, to five points', () => {
    const off: string[] = [];
    let [tried, sharp] = [0, 0];
    for (const plan of some) {
      const found = tryPlan(plan, 8, 20_000);
      if (typeof found === 'string') continue;
      tried++;
      if (plan.alpha < 0.01) sharp++;
      if (Math.abs(found.off) >= 0.05) off.push(`${JSON.stringify(plan)} ${JSON.stringify(found)}`);
    }
    expect(off).toEqual([]);
    expect(tried).toBeGreaterThan(25);
    expect(sharp).toBeGreaterThan(2);
  }, 240_000);
});

describe('what a simulated power leaves open', () => {
  it('holds where the cut can lie: of 1000 draws 37 to 63 or so lie beyond a cut at 5 %', () => {
    // SciPy 1.17.1: binom.ppf([0.025, 0.975], 1000, 0.05) = 37, 64; binom.ppf(.., 20, 0.5) = 6, 14; (.., 5, 1e-3) = 0, 0.
    expect(binomialRange(1000, 0.05, 0.95)).toEqual({ low: 37, high: 64 });
    expect(binomialRange(20, 0.5, 0.95)).toEqual({ low: 6, high: 14 });
    expect(binomialRange(5, 1e-3, 0.95)).toEqual({ low: 0, high: 0 });
  });
  it('is wide where few experiments lie beyond the cut, and covers what many say', () => {
    const effect: Effect = { kind: 'excess', size: 0.5, mean: 3, trials: 10 };
    const large = simulatePower(effect, 153, 0.001, { without: 200_000, with: 4000 }, 1)!;
    let covered = 0;
    for (let seed = 2; seed < 22; seed++) {
      const small = simulatePower(effect, 153, 0.001, { without: 4000, with: 1000 }, seed)!;
      if (small.low <= large.share && large.share <= small.high) covered++;
      expect(small.high - small.low).toBeGreaterThan(0.15);
    }
    expect(covered).toBeGreaterThanOrEqual(18);
    expect(simulatePower(effect, 153, 1e-6, { without: 1000, with: 500 }, 1)!.low).toBe(0);
  });
  it('is not asked of levels whose cut cannot be found', () => {
    expect(repeatsFor(0.05)).toEqual({ without: 20_000, with: 4000 });
    expect(repeatsFor(0.001)).toEqual({ without: 200_000, with: 4000 });
    expect(repeatsFor(1e-6)).toBeNull();
  });
});
