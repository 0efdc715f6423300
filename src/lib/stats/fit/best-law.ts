import { carried } from './carried';
import type { Climb } from './climb';
import { alike, starts } from './starts';
import type { FitData } from './fit-data';
import { lawLogLikelihood } from './law-log-likelihood';
import { sampleMoments } from './sample-moments';
import { search, type Effort } from './search';
import { toLaw, type TrialLevels } from './trial-levels';
import { workspace, type Workspace } from './workspace';

/** The best law found, and how. */
export interface BestLaw {
  levels: TrialLevels;
  /** Σ h_n ln f_n and its like for lumps and set-aside empty shots; nats. */
  logLikelihood: number;
  /** Starts searched, and how many of them ended within 0.01 nats of the best. */
  starts: number;
  agreeing: number;
}

/** Up to this many trials, or counts, single trials of the best law are tried far from where they are. */
const few = 100;

/** From each start; then the two best of these to the end. */
const first: Effort = { enough: 1e-5, worth: 1e-3, rounds: 60, transfers: 0 };
const brief: Effort = { ...first, rounds: 3 };
const thorough: Effort = { enough: 1e-9, worth: 1e-5, rounds: 200, transfers: 4 ** 9 };

/**
 * The Poisson-binomial law of greatest likelihood, from several spreads of its probabilities.
 *
 * The surface is not concave in the probabilities, so every start is searched to the end and the agreement
 * is reported; the floor (see floorLaw) then says how far from the global best it can be at most.
 *
 * Equal trials are a local maximum whenever the variance is at or above the ceiling, but not always the
 * global one: with a strong third moment a few uneven trials can do better (see starts).
 */
export function bestLaw(data: FitData): BestLaw {
  const moments = sampleMoments(data);
  const only = oneCount(data, moments.variance, moments.mean);
  if (only) return { levels: only, logLikelihood: 0, starts: 1, agreeing: 1 };
  const space = workspace(data);
  const last = data.first + data.shots.length - 1;
  const candidates = data.withoutEmpty
    ? conditioned(data, moments.mean)
    : starts(data.trials, moments, { first: data.below?.to ?? data.first, last: data.lump?.from ?? last });
  let effort = first;
  const found = candidates
    .map((start) => {
      const one = search(space, start, effort);
      // Even a law of the data's own cumulants underflows at a count seen: far from every law, and hours to crawl.
      if (one.value === -Infinity) effort = brief;
      return one;
    })
    .sort((a, b) => b.value - a.value);
  // With hundreds of trials the likelihood is flat among the good starts, and the second crawls.
  const polish = (data.trials ?? 0) > 100 ? 1 : 2;
  const end = effort === brief ? brief : thorough;
  const polished = found.slice(0, polish).map((one) => search(space, one.levels, end));
  const top = polished.reduce((a, b) => (b.value > a.value ? b : a));
  if (top.value === -Infinity) return underflowing(data, moments.mean);
  const best = (data.trials ?? last) <= few ? throughValleys(space, top) : top;
  const agreeing = [...polished, ...found.slice(polish)].filter(
    (one) => one.value > best.value - 0.01
  ).length;
  return { levels: best.levels, logLikelihood: best.value, starts: candidates.length, agreeing };
}

/** Carries single trials far away and searches from there, until nothing better is met. */
function throughValleys(space: Workspace, from: Climb): Climb {
  let best = from;
  for (let round = 0; round < 10; round++) {
    const next = carried(best.levels)
      .map((levels) => search(space, levels, first))
      .reduce((a, b) => (b.value > a.value ? b : a), best);
    if (!(next.value > best.value + first.worth)) break;
    best = search(space, next.levels, thorough);
  }
  return best;
}

/** Every shot had the same count, or lies in the lump: that many sure trials explain it with likelihood 1. */
function oneCount(data: FitData, variance: number, mean: number): TrialLevels | null {
  const inside = data.shots.some((shots) => shots > 0);
  if (data.lump ? inside || data.below : variance > 0) return null;
  const ones = data.lump ? data.lump.from : mean;
  return { p: [], trials: [], ones, zeros: (data.trials ?? Infinity) - ones, poissonPart: 0 };
}

/**
 * Counts so far from every start that its law underflows there (a variance hundreds of times the ceiling):
 * equal trials are then the best law, and their likelihood still has a logarithm.
 */
function underflowing(data: FitData, mean: number): BestLaw {
  const levels = alike(data.trials, mean);
  return { levels, logLikelihood: lawLogLikelihood(data, toLaw(levels)), starts: 1, agreeing: 1 };
}

/** Starts for a law conditioned on n ≥ 1: the unconditioned mean is a fraction of the mean seen. */
function conditioned(data: FitData, mean: number): TrialLevels[] {
  return [1, 0.8, 0.5].map((share) => alike(data.trials, Math.min(mean * share, data.trials ?? Infinity)));
}
