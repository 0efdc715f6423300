import type { FitData } from '../fit/fit-data';
import { solveSymmetric } from '../numerics/solve-symmetric';
import { chainScore, type ChainScore, type Kept } from './chain-score';
import { chainSlopes, type Chain, type ChainSpace } from './chain-space';
import { ringSlopes } from './ring-slopes';

/** A chain and the log-likelihood it reaches, nats. */
export interface ChainClimb {
  chain: Chain;
  value: number;
}

/** Everything a climb is made in. */
export interface ChainProblem {
  space: ChainSpace;
  data: FitData;
  rate: number;
  kept: Kept | null;
  /** The chain closes to a ring, whose even total is part of the law. Left out: it is open. */
  ring?: boolean;
}

/** Probabilities under 1e-20 of the mode; as in the plain fit. */
const trim = 1e-20;

/**
 * Climbs to a local maximum of the likelihood in the levels of a chain, its runs held: scoring (Newton with Fisher's
 * curvature), damped where a step does not gain, p kept in 0 … 1.
 *
 * @param enough ends when a step promises, or gains, less than this many nats
 * @param settled ends at this log-likelihood, short of the best
 * @returns value −Infinity when the start forbids a count that was seen
 */
export function chainClimb(
  problem: ChainProblem,
  from: Chain,
  enough: number,
  settled = Infinity
): ChainClimb {
  let chain = from;
  let score = scoreOf(problem, chain);
  let damping = 0;
  for (let round = 0; round < 60 && score.value > -Infinity && score.value < settled; round++) {
    const move = ascent(chain.p, score, damping);
    if (move.promise < enough) break;
    const p = chain.p.map((one, j) => Math.min(1, Math.max(0, one + move.step[j])));
    const next = { p, runs: chain.runs };
    const there = scoreOf(problem, next);
    if (there.value > score.value) {
      const gained = there.value - score.value;
      chain = next;
      score = there;
      damping = damping > 1e-6 ? damping / 10 : 0;
      if (gained < enough) break;
    } else {
      damping = damping === 0 ? 1e-3 : damping * 10;
      if (damping > 1e9) break;
    }
  }
  return { chain, value: score.value };
}

function scoreOf({ space, data, rate, kept, ring }: ChainProblem, chain: Chain): ChainScore {
  // Without a lump above, the likelihood asks for nothing beyond the largest count seen, or kept.
  const last = data.lump ? Infinity : (kept?.to ?? data.first + data.shots.length - 1);
  const fill = (ends: number) =>
    ring ? ringSlopes(space, chain, rate, ends, last) : chainSlopes(space, chain, rate, ends, last);
  fill(trim);
  const score = chainScore(space, chain.p.length, data, kept);
  if (score.value > -Infinity) return score;
  fill(0);
  return chainScore(space, chain.p.length, data, kept);
}

/** Step of the levels that are free: one at 0 or 1 that wants to go beyond stays. */
function ascent(
  p: number[],
  { slope, curvature }: ChainScore,
  damping: number
): { step: number[]; promise: number } {
  const size = p.length;
  const free = p
    .map((_, j) => j)
    .filter((j) => !((p[j] <= 0 && slope[j] <= 0) || (p[j] >= 1 && slope[j] >= 0)));
  const matrix = free.flatMap((i) => free.map((j) => curvature[i * size + j] * (i === j ? 1 + damping : 1)));
  const right = free.map((j) => slope[j]);
  const solved = solveSymmetric(matrix, free.length, right);
  const step = new Array<number>(size).fill(0);
  free.forEach((j, k) => (step[j] = solved[k]));
  return { step, promise: right.reduce((sum, s, k) => sum + s * solved[k], 0) / 2 };
}
