import { logLikelihood } from '$lib/stats/fit/log-likelihood';
import { slopes } from '$lib/stats/fit/slopes';
import { copyLevels, type TrialLevels } from '$lib/stats/fit/trial-levels';
import { workspace, type Workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, levelsOf, plainLogLikelihood, probabilities, type Problem } from './plain';

const shots = [12, 40, 66, 31, 9, 3];
const situations: { name: string; problem: Problem; levels: TrialLevels }[] = [
  {
    name: 'levels alone, with sure and impossible trials',
    problem: { shots: [0, ...shots], trials: 9 },
    levels: levelsOf(
      [
        [0.15, 4],
        [0.4, 1],
        [0.72, 2]
      ],
      { ones: 1, zeros: 1 }
    )
  },
  {
    name: 'a lump',
    problem: { shots: shots.slice(0, 4), trials: 9, lump: { from: 4, shots: 17 } },
    levels: levelsOf([
      [0.15, 5],
      [0.3, 3],
      [0.8, 1]
    ])
  },
  {
    name: 'an opening row',
    problem: { shots: [0, 0, 0, ...shots.slice(3)], trials: 9, below: { to: 2, shots: 118 } },
    levels: levelsOf(
      [
        [0.15, 5],
        [0.3, 2],
        [0.8, 1]
      ],
      { ones: 1 }
    )
  },
  {
    name: 'lumps at both ends, counts between never seen',
    problem: {
      shots: [0, 0, 0, 31, 9, 0],
      trials: 9,
      below: { to: 1, shots: 52 },
      lump: { from: 6, shots: 5 }
    },
    levels: levelsOf([
      [0.2, 5],
      [0.6, 3],
      [0.8, 1]
    ])
  },
  {
    name: 'a Poisson part and lumps at both ends',
    problem: {
      shots: [0, 0, 66, 31],
      trials: null,
      below: { to: 1, shots: 52 },
      lump: { from: 4, shots: 17 }
    },
    levels: levelsOf([[0.25, 3]], { zeros: Infinity, poissonPart: 1.4 })
  },
  {
    name: 'empty shots set aside',
    problem: { shots, trials: 9, withoutEmpty: true },
    levels: levelsOf([
      [0.1, 4],
      [0.35, 5]
    ])
  },
  {
    name: 'empty shots set aside, and a lump',
    problem: { shots: shots.slice(0, 4), trials: 9, withoutEmpty: true, lump: { from: 4, shots: 17 } },
    levels: levelsOf([
      [0.1, 4],
      [0.35, 5]
    ])
  },
  {
    name: 'a Poisson part',
    problem: { shots, trials: null },
    levels: levelsOf(
      [
        [0.25, 3],
        [0.55, 1]
      ],
      { zeros: Infinity, poissonPart: 0.9 }
    )
  },
  {
    name: 'a Poisson part and a lump',
    problem: { shots: shots.slice(0, 4), trials: null, lump: { from: 4, shots: 17 } },
    levels: levelsOf([[0.25, 3]], { zeros: Infinity, poissonPart: 1.4 })
  }
];

function moved(levels: TrialLevels, j: number, by: number): TrialLevels {
  const out = copyLevels(levels);
  if (j < out.p.length) out.p[j] += by;
  else out.poissonPart += by;
  return out;
}

function gradientAt(space: Workspace, levels: TrialLevels): number[] {
  logLikelihood(space, levels);
  // A copy: the next call overwrites it.
  return Array.from(slopes(space, levels).gradient);
}

describe.each(situations)('slopes with $name', ({ problem, levels }) => {
  const space = workspace(dataOf(problem));
  const value = (at: TrialLevels) => plainLogLikelihood(problem, probabilities(at), at.poissonPart);
  const size = levels.p.length + (levels.poissonPart > 0 ? 1 : 0);

  it('the likelihood itself is the plain one', () => {
    expect(logLikelihood(space, levels)).toBeCloseTo(value(levels), 9);
  });

  it('first derivatives agree with differences of the plain likelihood', () => {
    const got = gradientAt(space, levels);
    expect(got).toHaveLength(size);
    const step = 1e-4;
    for (let j = 0; j < size; j++) {
      const differ = (h: number) => (value(moved(levels, j, h)) - value(moved(levels, j, -h))) / (2 * h);
      // Richardson: the error of a central difference falls with the square of its step.
      const want = (4 * differ(step / 2) - differ(step)) / 3;
      expect(Math.abs(got[j] - want)).toBeLessThan(1e-6 * (1 + Math.abs(want)));
    }
  });

  it('second derivatives agree with differences of the first', () => {
    logLikelihood(space, levels);
    const hessian = Array.from(slopes(space, levels).hessian);
    const step = 1e-4;
    for (let k = 0; k < size; k++) {
      const up = gradientAt(space, moved(levels, k, step));
      const down = gradientAt(space, moved(levels, k, -step));
      for (let j = 0; j < size; j++) {
        const want = (up[j] - down[j]) / (2 * step);
        expect(Math.abs(hessian[j * size + k] - want), `${j} ${k}`).toBeLessThan(
          1e-5 * (10 + Math.abs(want))
        );
      }
    }
  });
});

describe('the Fisher part of the Hessian', () => {
  it('is positive semidefinite, and the whole of it for one trial', () => {
    // One trial: f is linear in p, so that −L″ is the Fisher part alone.
    const space = workspace(dataOf({ shots: [60, 40], trials: 1 }));
    const levels = levelsOf([[0.3, 1]]);
    logLikelihood(space, levels);
    const { fisher, hessian } = slopes(space, levels);
    expect(fisher[0]).toBeCloseTo(60 / 0.7 ** 2 + 40 / 0.3 ** 2, 9);
    expect(hessian[0]).toBeCloseTo(-fisher[0], 9);
  });
});
