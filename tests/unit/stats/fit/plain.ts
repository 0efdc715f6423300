import { fitData, type FitData } from '$lib/stats/fit/fit-data';
import type { TrialLevels } from '$lib/stats/fit/trial-levels';

export interface Problem {
  shots: number[];
  trials: number | null;
  lump?: { from: number; shots: number } | null;
  below?: { to: number; shots: number } | null;
  withoutEmpty?: boolean;
}

/** FitData of shots at counts 0, 1, 2, … */
export function dataOf({ shots, trials, lump = null, below = null, withoutEmpty = false }: Problem): FitData {
  const counts = shots.map((h, n): [number, number] => [n, h]).filter(([, h]) => h > 0);
  return fitData({ kind: 'histogram', counts, lump, below }, trials, withoutEmpty);
}

/** Levels with `ones` and `zeros` and a Poisson part. */
export function levelsOf(
  rows: [number, number][],
  rest: Partial<Omit<TrialLevels, 'p' | 'trials'>> = {}
): TrialLevels {
  return {
    p: rows.map(([p]) => p),
    trials: rows.map(([, m]) => m),
    ones: 0,
    zeros: 0,
    poissonPart: 0,
    ...rest
  };
}

/** One probability for each trial. */
export function probabilities({ p, trials, ones, zeros }: TrialLevels): number[] {
  const many = (value: number, times: number) =>
    new Array<number>(Number.isFinite(times) ? times : 0).fill(value);
  return [...many(1, ones), ...p.flatMap((value, j) => many(value, trials[j])), ...many(0, zeros)];
}

/** Poisson-binomial pmf, trials added one at a time; the Poisson part by its series over `last` counts. */
export function plainPmf(p: number[], poissonPart = 0, last = p.length): number[] {
  let f = new Array<number>(last + 1).fill(0);
  f[0] = Math.exp(-poissonPart);
  for (let n = 1; n <= last; n++) f[n] = (f[n - 1] * poissonPart) / n;
  for (const one of p) f = f.map((value, n) => value * (1 - one) + (n > 0 ? f[n - 1] * one : 0));
  return f;
}

/** The log-likelihood by its definition, sharing nothing with the search. */
export function plainLogLikelihood(problem: Problem, p: number[], poissonPart = 0): number {
  const { shots, lump, withoutEmpty } = problem;
  const f = plainPmf(
    p,
    poissonPart,
    Math.max(p.length, shots.length, lump?.from ?? 0) + (poissonPart > 0 ? 60 : 0)
  );
  let sum = 0;
  let total = lump?.shots ?? 0;
  shots.forEach((h, n) => {
    if (h === 0 || (withoutEmpty && n === 0)) return;
    sum += h * Math.log(f[n]);
    total += h;
  });
  if (lump) sum += lump.shots * Math.log(f.slice(lump.from).reduce((a, b) => a + b, 0));
  const { below } = problem;
  if (below) sum += below.shots * Math.log(f.slice(0, below.to + 1).reduce((a, b) => a + b, 0));
  if (withoutEmpty) sum -= total * Math.log1p(-f[0]);
  return sum;
}
