import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { pulls, type Pull } from '$lib/stats/fit/pulls';
import { slopes } from '$lib/stats/fit/slopes';
import type { TrialLevels } from '$lib/stats/fit/trial-levels';
import { workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf, plainLogLikelihood, plainPmf, probabilities, type Problem } from './plain';

const shots = [12, 40, 66, 31, 9, 3];

function pullsAt(problem: Problem, levels: TrialLevels) {
  const space = workspace(dataOf(problem));
  logLikelihood(space, levels);
  const slope = slopes(space, levels);
  return { ...pulls(space, levels, slope), fisher: slope.fisher };
}

/** Slope and curvature in x of L at 0, from a function of x, by differences on one side. */
function derivatives(value: (x: number) => number, h: number): { slope: number; weight: number } {
  const [a, b, c, d] = [0, h, 2 * h, 3 * h].map(value);
  return {
    slope: (-11 * a + 18 * b - 9 * c + 2 * d) / (6 * h),
    weight: -(2 * a - 5 * b + 4 * c - d) / (h * h)
  };
}

function expectPull(pull: Pull | null, want: { slope: number; weight: number }): void {
  expect(pull).not.toBeNull();
  expect(Math.abs(pull!.slope - want.slope)).toBeLessThan(1e-4 * (1 + Math.abs(want.slope)));
  expect(Math.abs(pull!.weight - want.weight)).toBeLessThan(1e-2 * (1 + Math.abs(want.weight)));
}

const situations: { name: string; problem: Problem; levels: TrialLevels }[] = [
  {
    name: 'all counts',
    problem: { shots: [0, ...shots], trials: 10 },
    levels: levelsOf(
      [
        [0.15, 4],
        [0.45, 3]
      ],
      { ones: 1, zeros: 2 }
    )
  },
  {
    name: 'a lump',
    problem: { shots: [0, ...shots.slice(0, 4)], trials: 10, lump: { from: 5, shots: 12 } },
    levels: levelsOf(
      [
        [0.15, 4],
        [0.45, 3]
      ],
      { ones: 1, zeros: 2 }
    )
  },
  {
    name: 'empty shots set aside',
    problem: { shots, trials: 9, withoutEmpty: true },
    levels: levelsOf(
      [
        [0.12, 4],
        [0.5, 3]
      ],
      { zeros: 2 }
    )
  },
  {
    name: 'empty shots set aside and a sure trial, whose leaving makes shots empty',
    problem: { shots, trials: 9, withoutEmpty: true },
    levels: levelsOf(
      [
        [0.12, 4],
        [0.3, 3]
      ],
      { ones: 1, zeros: 1 }
    )
  }
];

describe.each(situations)('pulls with $name', ({ problem, levels }) => {
  const wants = pullsAt(problem, levels);
  const p = probabilities(levels);
  const value = (q: number[]) => plainLogLikelihood(problem, q);

  it('of a level that splits: slope and weight in x = ½Σδ²', () => {
    levels.p.forEach((level, j) => {
      const places = p.flatMap((q, k) => (q === level ? [k] : []));
      const spread = (x: number) => {
        const q = [...p];
        // Two trials by ±δ: ½Σδ² = δ².
        q[places[0]] += Math.sqrt(x);
        q[places[1]] -= Math.sqrt(x);
        return value(q);
      };
      expectPull(wants.split[j], derivatives(spread, 1e-4));
    });
  });

  it('of a trial that leaves 0, and of one that leaves 1', () => {
    const leave = (end: 0 | 1) => (x: number) => {
      const q = [...p];
      q[q.indexOf(end)] = end === 0 ? x : 1 - x;
      return value(q);
    };
    expectPull(wants.leaveZero, derivatives(leave(0), 1e-4));
    if (levels.ones > 0) expectPull(wants.leaveOne, derivatives(leave(1), 1e-4));
    else expect(wants.leaveOne).toBeNull();
  });
});

describe('pulls', () => {
  it('of a Poisson part that gives up a trial: slope in x = ½p²', () => {
    const problem = { shots, trials: null };
    const levels = levelsOf([[0.35, 3]], { zeros: Infinity, poissonPart: 1 });
    const wants = pullsAt(problem, levels);
    const gain = (p: number) => {
      const at = (q: number) => plainLogLikelihood(problem, [...probabilities(levels), q], 1 - q);
      return (at(p) - at(0)) / (p ** 2 / 2);
    };
    // The move is of second order in p with an error of first: extrapolated to p = 0.
    expect(wants.poissonSplit!.slope).toBeCloseTo(2 * gain(0.002) - gain(0.004), 2);
    expect(wants.leaveZero).toBeNull();
    expect(wants.split[0]).not.toBeNull();
  });

  it('couple to the levels through Σ h/f² ∂f/∂x ∂f/∂p, cell by cell', () => {
    const problem = { shots, trials: 8 };
    const levels = levelsOf(
      [
        [0.2, 3],
        [0.4, 4]
      ],
      { zeros: 1 }
    );
    const { leaveZero } = pullsAt(problem, levels);
    const p = probabilities(levels);
    const f = plainPmf(p);
    const step = 1e-6;
    const change = (q: number[]) => plainPmf(q).map((value, n) => (value - f[n]) / step);
    const leaving = change(p.map((one, k) => (k === 7 ? step : one)));
    levels.p.forEach((level, j) => {
      const along = change(p.map((one) => (one === level ? one + step : one)));
      let want = 0;
      shots.forEach((h, n) => (want += (h / f[n] ** 2) * leaving[n] * along[n]));
      expect(Math.abs(leaveZero!.touch[j] / want - 1)).toBeLessThan(1e-3);
    });
  });

  it('asks no split of a single trial, and nothing of a pool that is empty', () => {
    const wants = pullsAt(
      { shots, trials: 6 },
      levelsOf([
        [0.2, 1],
        [0.35, 5]
      ])
    );
    expect(wants.split[0]).toBeNull();
    expect(wants.split[1]).not.toBeNull();
    expect([wants.leaveZero, wants.leaveOne, wants.poissonSplit]).toEqual([null, null, null]);
  });
});
