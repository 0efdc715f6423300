import type { FitData } from '../fit/fit-data';
import { baseMeasure } from './base-measure';
import { forEachCount, knotFit } from './knot-fit';

/** The best law that obeys Newton's inequalities. */
export interface FloorLaw {
  /** KL(p̂ ‖ floor law), nats a shot: no independent-trial law comes closer to the data than this. */
  divergence: number;
  /** ln f_n at the counts data.first … of data.shots. */
  logProbabilities: Float64Array;
  /** Counts where ln f_n − ln C(N, n) bends. */
  knots: number[];
  /** Slope of the divergence towards the best knot not yet used, nats; the floor is this near or nearer. */
  slack: number;
}

/** Stop when no further knot promises a slope of more than this, nats a shot. */
const enough = 1e-10;

/**
 * Maximum likelihood over all laws with ln f_n − ln C(N, n) concave (ln f_n + ln n! when N is unknown).
 *
 * A log-concave likelihood against a base measure: the maximum is piecewise linear, its support ends with
 * the counts seen, and the problem is convex. Active set: fit the values at the knots, drop knots that
 * would bend upward, add the knot of steepest promise (Dümbgen, Hüsler & Rufibach 2007, from memory).
 *
 * Lumps take their own shares of the probability freely, which keeps the problem convex and the result a
 * lower limit. Empty input gives divergence 0.
 */
export function floorLaw(given: FitData): FloorLaw {
  const data = given.lump || given.below ? withoutEnds(given) : given;
  const size = data.shots.length;
  const singles = data.total - (data.lump?.shots ?? 0) - (data.below?.shots ?? 0);
  if (size === 0 || singles === 0)
    return { divergence: 0, logProbabilities: new Float64Array(size), knots: [], slack: 0 };
  const share = singles / data.total;
  const weights = data.shots.map((shots) => shots / singles);
  const base = baseMeasure(data.trials, data.first, data.first + size - 1);
  let knots = size === 1 ? [0] : [0, size - 1];
  let fit = knotFit(weights, base, knots, firstLine(weights, base, knots));
  let slack = 0;
  for (let round = 0; round < 20 * size; round++) {
    const line = interpolate(knots, fit.values, size);
    const next = steepest(weights, base, line, knots);
    slack = next.promise;
    if (!(next.promise > enough)) break;
    const before = fit.score;
    knots = [...knots, next.at].sort((a, b) => a - b);
    let current = line;
    for (;;) {
      fit = knotFit(
        weights,
        base,
        knots,
        Float64Array.from(knots, (n) => current[n])
      );
      const target = interpolate(knots, fit.values, size);
      const step = furthest(current, target, knots);
      if (step.share >= 1) break;
      // As far along as concavity allows; the knot that went straight there is dropped.
      current = current.map((value, n) => value + step.share * (target[n] - value));
      knots = knots.filter((n) => n !== step.knot);
    }
    // Rounding, not progress: the promise is then smaller than the score can show.
    if (!(fit.score > before)) break;
  }
  return finish(data, weights, base, interpolate(knots, fit.values, size), knots, share, slack);
}

/** The same counts from the first to the last seen: beside a lump there may be empty ones, where no law ends. */
function withoutEnds(data: FitData): FitData {
  let start = 0;
  let end = data.shots.length;
  while (start < end && data.shots[start] === 0) start++;
  while (end > start && data.shots[end - 1] === 0) end--;
  return { ...data, first: data.first + start, shots: data.shots.subarray(start, end) };
}

/** A straight line through the law's own scale: −b at the data's mode, sloped to match the two ends. */
function firstLine(weights: Float64Array, base: Float64Array, knots: number[]): Float64Array {
  let mode = 0;
  for (let n = 0; n < weights.length; n++) if (weights[n] > weights[mode]) mode = n;
  // The slope that makes neighbours of the mode alike: e^{slope} = C(mode)/C(mode+1).
  const slope =
    mode + 1 < base.length ? base[mode] - base[mode + 1] : mode > 0 ? base[mode - 1] - base[mode] : 0;
  const level = Math.log(weights[mode]) - base[mode];
  return Float64Array.from(knots, (n) => level + slope * (n - mode));
}

function interpolate(knots: number[], values: Float64Array, size: number): Float64Array {
  const out = new Float64Array(size);
  forEachCount(knots, (n, k, share) => {
    out[n] = share > 0 ? values[k] * (1 - share) + values[k + 1] * share : values[k];
  });
  return out;
}

/** The count where a downward bend raises the score most: slope −Σ_{x>n} (x−n)(w_x − f_x). */
function steepest(weights: Float64Array, base: Float64Array, line: Float64Array, knots: number[]) {
  const used = new Set(knots);
  const best = { at: -1, promise: 0 };
  let excess = 0;
  let moment = 0;
  for (let n = weights.length - 1; n >= 0; n--) {
    // moment = Σ_{x>n} (x−n)(w_x−f_x), excess = Σ_{x>n} (w_x−f_x).
    if (!used.has(n) && -moment > best.promise) {
      best.at = n;
      best.promise = -moment;
    }
    excess += weights[n] - Math.exp(line[n] + base[n]);
    moment += excess;
  }
  return best;
}

/** How far from `from` towards `to` every inner knot still bends down, and the knot that ends it. */
function furthest(from: Float64Array, to: Float64Array, knots: number[]): { share: number; knot: number } {
  const out = { share: 1, knot: -1 };
  for (let k = 1; k + 1 < knots.length; k++) {
    const bendTo = bend(to, knots, k);
    if (bendTo <= 0) continue;
    const bendFrom = Math.min(0, bend(from, knots, k));
    const share = bendFrom / (bendFrom - bendTo);
    if (share < out.share) {
      out.share = share;
      out.knot = knots[k];
    }
  }
  return out;
}

/** Change of slope at knot k; concave where ≤ 0. */
function bend(line: Float64Array, knots: number[], k: number): number {
  const [a, n, b] = [knots[k - 1], knots[k], knots[k + 1]];
  return (line[b] - line[n]) / (b - n) - (line[n] - line[a]) / (n - a);
}

function finish(
  data: FitData,
  weights: Float64Array,
  base: Float64Array,
  line: Float64Array,
  knots: number[],
  share: number,
  slack: number
): FloorLaw {
  let mass = 0;
  for (let n = 0; n < line.length; n++) mass += Math.exp(line[n] + base[n]);
  const logProbabilities = line.map((value, n) => value + base[n] - Math.log(mass) + Math.log(share));
  let divergence = 0;
  for (let n = 0; n < line.length; n++) {
    if (weights[n] > 0)
      divergence += share * weights[n] * (Math.log(share * weights[n]) - logProbabilities[n]);
  }
  return {
    divergence: Math.max(0, divergence),
    logProbabilities,
    knots: knots.map((n) => n + data.first),
    slack
  };
}
