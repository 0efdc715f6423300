import type { FitData } from '../fit/fit-data';
import { sampleMoments } from '../fit/sample-moments';
import { chainClimb, type ChainClimb, type ChainProblem } from './chain-climb';
import type { Kept } from './chain-score';
import { chainSpace, type Chain } from './chain-space';
import { misreadCeiling } from './misread-ceiling';
import { saturated } from '../resampling/divergence';
import { evenChain, twoLevels } from './chain-starts';
import { ringCeiling } from './ring-ceiling';

/** The best chain found, and the best of equal bonds. */
export interface ChainFit extends ChainClimb {
  even: ChainClimb;
}

/** Levels at most: data tell three apart at the very best. */
export const mostLevels = 3;
/**
 * Without misreads a step along the chain costs little, and the levels alone matter: with three of them ten uneven modes
 * of which counts from 0 to 4 were kept were ruled out at 5 % in 6 of 10 repeats of 20 000 shots.
 */
export const mostLevelsCut = 6;

/** Stretches of the rarer level that are tried first, beside one. */
const usualApart = 12;
/** G² a cell from which the order of the bonds is looked into; about 1 is expected of a law that fits. */
const misfits = 3;
/** Bonds above which that would take minutes. */
const mostToOrder = 200;

/**
 * The best law found for the counts of independent kinks on an open chain whose sites are misread with probability ε.
 *
 * The order of the bonds matters once sites are misread, so the family searched is stated, and it is not all laws:
 * equal bonds; two levels, in one stretch each or with the rarer one in stretches spread evenly along the chain (twelve
 * at most; any number where that fits badly and the variance is below its ceiling); three
 * levels, by halving a level of the best two, and so on up to six where only some counts were kept. Levels may reach 0
 * and 1.
 *
 * How far that reaches (best law of the family from the truth, nats a shot, ε = 0.01): 3e-10 for p rising steadily from
 * 0 to 0.3, 5e-8 for p anywhere between 0 and 0.2, 4e-6 for 0.02 and 0.2 alternating, all with 100 bonds.
 * It falls short where bonds are sure or excluded in an order of their own: with p all 0 or 1 at random along 30 bonds and
 * ε = 0.03 a G² of 89 was left at 5000 shots. Such kinks, though independent, look like a misfit, and
 * the answer then is that it cannot tell (restsOnSearch).
 *
 * @param data trials = N bonds; `kept` sets counts aside that lie outside it (conditioned law), null for none
 * @param ring the chain closes to a ring, whose even total is part of the law
 * @param enough nats to which the last climb is made
 */
export function chainFit(
  data: FitData,
  rate: number,
  kept: Kept | null = null,
  enough = 1e-9,
  ring = false
): ChainFit {
  const bonds = data.trials!;
  const moments = sampleMoments(data);
  const problem: ChainProblem = {
    space: chainSpace(bonds, kept ? mostLevelsCut : mostLevels),
    data,
    rate,
    kept,
    ...(ring && { ring })
  };
  // Counts set aside move the mean: several starts stand in for the one that is right without.
  const means = kept ? [1, 0.8, 1.25].map((share) => moments.mean * share) : [moments.mean];
  const even = means
    .map((mean) => chainClimb(problem, evenChain(bonds, mean, rate, ring), 1e-6))
    .reduce((a, b) => (b.value > a.value ? b : a));
  let best = even;
  const searched = new Map<number, number>();
  const setApart = (apart: number): number => {
    const known = searched.get(apart);
    if (known !== undefined) return known;
    const tried = new Map<number, ChainClimb>();
    const at = (many: number): number => {
      const start = tried.has(many) ? null : twoLevels(bonds, many, apart, moments, rate, ring);
      if (start) tried.set(many, chainClimb(problem, start, 1e-6));
      return tried.get(many)?.value ?? -Infinity;
    };
    const found = tried.get(bestLength(at, bonds));
    if (found && found.value > best.value + 1e-6) best = found;
    searched.set(apart, found?.value ?? -Infinity);
    return found?.value ?? -Infinity;
  };
  setApart(1);
  setApart(usualApart);
  // Sure and excluded bonds in an order of their own leave marks that other numbers of stretches do not.
  const misfit = 2 * (saturated(data) - best.value) > misfits * data.shots.length;
  if (
    !kept &&
    bonds >= 4 &&
    bonds <= mostToOrder &&
    misfit &&
    moments.variance < (ring ? ringCeiling : misreadCeiling)(bonds, rate)(moments.mean).variance
  )
    bestLength(setApart, (bonds >> 1) + 1);
  for (let levels = 2; levels < (kept ? mostLevelsCut : mostLevels); levels++) {
    const from = best.chain;
    if (from.p.length !== levels) break;
    for (const level of from.p.keys()) {
      const halved = halve(from, level);
      const found = halved && chainClimb(problem, halved, 1e-6);
      if (found && found.value > best.value + 1e-4) best = found;
    }
  }
  return { ...chainClimb(problem, best.chain, enough), even };
}

/** Largest of a function of a length 1 … N − 1: a coarse grid, then ever shorter strides from its best. */
function bestLength(value: (many: number) => number, bonds: number): number {
  let best = Math.max(1, bonds >> 1);
  for (const share of [0.04, 0.1, 0.25, 0.75, 0.9]) {
    const many = Math.min(bonds - 1, Math.max(1, Math.round(share * bonds)));
    if (value(many) > value(best)) best = many;
  }
  for (let stride = Math.max(1, Math.round(bonds / 8)); ; stride >>= 1) {
    for (const many of [best - stride, best + stride]) {
      if (many >= 1 && many < bonds && value(many) > value(best)) best = many;
    }
    if (stride <= 1) return best;
  }
}

/** One level made two, well apart, each run of it cut in the middle. */
function halve({ p, runs }: Chain, level: number): Chain | null {
  const trials = runs.reduce((sum, run) => sum + (run.level === level ? run.trials : 0), 0);
  const room = Math.min(p[level], 1 - p[level], 0.4);
  if (trials < 2 || room < 1e-6) return null;
  const third = p.length;
  const near = level === 0 ? [third, level] : [level, third];
  let up = true;
  return {
    p: [...p.map((one, j) => (j === level ? one - room / 2 : one)), p[level] + room / 2],
    runs: runs.flatMap((run) => {
      if (run.level !== level) return [run];
      if (run.trials === 1) {
        up = !up;
        return [{ level: up ? third : level, trials: 1 }];
      }
      const first = run.trials >> 1;
      return [
        { level: near[0], trials: first },
        { level: near[1], trials: run.trials - first }
      ];
    })
  };
}
