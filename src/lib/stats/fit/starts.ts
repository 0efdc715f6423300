import type { SampleMoments } from './sample-moments';
import type { TrialLevels } from './trial-levels';

/** Above this many trials the two-level starts are left out: they cost most and have never won there. */
const manyTrials = 100;

/**
 * Parts of the ceiling by which two-level starts lie under it when the data do not. With the variance at or above the
 * ceiling equal trials are a local maximum, but with a strong third or fourth moment not the global one: of ten shots
 * at N = 3, three empty and seven with count 2, the variance is 1.125 times the ceiling, and p = 0, 0.7, 0.7 beats
 * equal trials by 0.8 nats.
 */
const lopsided = [0.12, 0.35];

/** Smallest and largest count seen. */
export interface CountRange {
  first: number;
  last: number;
}

/**
 * Spreads of the probabilities to start a search from, widest apart in shape, all with the sample mean.
 *
 * @param trials N, or null
 * @param moments sample mean, variance (1/S) and third central moment
 * @param seen smallest and largest count that must stay possible: a start that forbids one leads nowhere
 *
 * Optima sit at few levels with many trials at exactly 0 and 1, so the first start is the law of that form
 * with the cumulants seen. Then all alike; then, for few trials, two levels with the variance seen (or, when that
 * is too large, with less than the ceiling) and a tenth, a third, half, two thirds or most of the trials high. The search
 * moves freely from there, so these only have to lie in different valleys.
 */
export function starts(trials: number | null, moments: SampleMoments, seen: CountRange): TrialLevels[] {
  const { mean, variance } = moments;
  const out = [alike(trials, mean)];
  const pool = trials ?? Math.max(seen.last + 8, Math.ceil(4 * mean));
  const ceiling = mean * (1 - mean / pool);
  if (!(ceiling > 0) || pool < 2) return out;
  if (variance < ceiling) out.unshift(pools(trials, moments, seen));
  const below = 1 - variance / ceiling;
  const parts = below > lopsided[0] ? [below] : lopsided;
  for (const part of pool <= manyTrials ? parts : []) {
    for (const share of [0.1, 0.35, 0.5, 0.65, 0.9])
      out.push(twoLevels(trials, pool, mean, part * ceiling, share));
  }
  return out.map((levels) => withPoisson(levels, trials));
}

/**
 * A sure trials, M trials at p, the rest at 0: Mp(1−p) = κ2, κ3 = κ2(1−2p), A + Mp = κ1; with fewer sure and more
 * moving trials where a count seen would otherwise be impossible.
 */
function pools(
  trials: number | null,
  { mean, variance, third }: SampleMoments,
  { first, last }: CountRange
): TrialLevels {
  const most = trials ?? Infinity;
  // One count alone, or a lump alone, has no variance.
  const p = variance > 0 ? Math.min(0.95, Math.max(0.05, (1 - third / variance) / 2)) : 0.5;
  const spread = Math.min(most, Math.max(1, Math.round(variance / (p * (1 - p)))));
  const ones = Math.min(most - spread, first, Math.max(0, Math.round(mean - spread * p)));
  const moving = Math.max(spread, last - ones);
  return {
    p: [clip((mean - ones) / moving)],
    trials: [moving],
    ones,
    zeros: most - moving - ones,
    poissonPart: 0
  };
}

/** Two levels whose Σ(p − mean/N)² is `excess`: the ceiling less their variance. */
function twoLevels(
  trials: number | null,
  pool: number,
  mean: number,
  excess: number,
  share: number
): TrialLevels {
  const high = Math.min(pool - 1, Math.max(1, Math.round(share * pool)));
  const up = Math.sqrt((excess * (pool - high)) / (high * pool));
  const down = Math.sqrt((excess * high) / ((pool - high) * pool));
  const p = [clip(mean / pool + up), clip(mean / pool - down)];
  return { p, trials: [high, pool - high], ones: 0, zeros: trials === null ? Infinity : 0, poissonPart: 0 };
}

/** Equal trials; a Poisson law when N is unknown. */
export function alike(trials: number | null, mean: number): TrialLevels {
  if (trials === null) return { p: [], trials: [], ones: 0, zeros: Infinity, poissonPart: mean };
  if (mean <= 0) return { p: [], trials: [], ones: 0, zeros: trials, poissonPart: 0 };
  if (mean >= trials) return { p: [], trials: [], ones: trials, zeros: 0, poissonPart: 0 };
  return { p: [mean / trials], trials: [trials], ones: 0, zeros: 0, poissonPart: 0 };
}

/** With N unknown a Poisson part must be there to grow: it takes a tenth of what the levels have. */
function withPoisson(levels: TrialLevels, trials: number | null): TrialLevels {
  if (trials !== null || levels.p.length === 0) return levels;
  const sum = levels.p.reduce((total, p, j) => total + p * levels.trials[j], 0);
  return { ...levels, p: levels.p.map((p) => 0.9 * p), poissonPart: 0.1 * sum };
}

function clip(p: number): number {
  return Math.min(0.999, Math.max(0.001, p));
}
