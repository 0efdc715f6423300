/** Values at the knots that maximise the likelihood, for given knots. */
export interface KnotFit {
  values: Float64Array;
  /** Σ w ℓ − Σ e^{ℓ+b} + 1. */
  score: number;
}

/**
 * Maximises Σ_n w_n ℓ_n − Σ_n exp(ℓ_n + b_n) over ℓ linear between knots, by damped Newton.
 *
 * @param weights shares w_n, summing to 1
 * @param base b_n = ln C(N, n) or −ln n!
 * @param knots indices, ascending, the first and the last included
 * @param start values at the knots
 *
 * Concave in the values, with a tridiagonal Hessian, since each count lies between two knots. At the
 * maximum Σ e^{ℓ+b} = 1 of itself, so no normalisation is imposed.
 */
export function knotFit(
  weights: Float64Array,
  base: Float64Array,
  knots: number[],
  start: Float64Array
): KnotFit {
  const size = knots.length;
  let values = start;
  let score = scoreOf(weights, base, knots, values);
  for (let step = 0; step < 100; step++) {
    const gradient = new Float64Array(size);
    const diagonal = new Float64Array(size);
    const beside = new Float64Array(size);
    forEachCount(knots, (n, k, share) => {
      const mass = Math.exp(values[k] * (1 - share) + (share > 0 ? values[k + 1] * share : 0) + base[n]);
      const pull = weights[n] - mass;
      gradient[k] += pull * (1 - share);
      diagonal[k] += mass * (1 - share) ** 2;
      if (share > 0) {
        gradient[k + 1] += pull * share;
        diagonal[k + 1] += mass * share ** 2;
        beside[k] += mass * share * (1 - share);
      }
    });
    const move = tridiagonal(diagonal, beside, gradient);
    let promise = 0;
    for (let k = 0; k < size; k++) promise += move[k] * gradient[k];
    if (!(promise > 1e-17)) break;
    let share = 1;
    let next = values;
    let reached = -Infinity;
    for (let halving = 0; halving < 60; halving++, share /= 2) {
      next = values.map((value, k) => value + share * move[k]);
      reached = scoreOf(weights, base, knots, next);
      if (reached >= score + 1e-4 * share * promise) break;
    }
    if (!(reached > score)) break;
    values = next;
    score = reached;
  }
  return { values, score };
}

function scoreOf(weights: Float64Array, base: Float64Array, knots: number[], values: Float64Array): number {
  let sum = 1;
  forEachCount(knots, (n, k, share) => {
    const line = values[k] * (1 - share) + (share > 0 ? values[k + 1] * share : 0);
    if (weights[n] > 0) sum += weights[n] * line;
    sum -= Math.exp(line + base[n]);
  });
  return Number.isNaN(sum) ? -Infinity : sum;
}

/** Each count with the knot at or before it and how far it is towards the next, 0 ≤ share < 1. */
export function forEachCount(knots: number[], visit: (n: number, knot: number, share: number) => void): void {
  for (let k = 0; k + 1 < knots.length; k++) {
    const span = knots[k + 1] - knots[k];
    for (let n = knots[k]; n < knots[k + 1]; n++) visit(n, k, (n - knots[k]) / span);
  }
  visit(knots[knots.length - 1], knots.length - 1, 0);
}

/** Solves the symmetric tridiagonal system; a ridge of 1e-14 stands in where a knot carries no mass yet. */
function tridiagonal(diagonal: Float64Array, beside: Float64Array, right: Float64Array): Float64Array {
  const size = diagonal.length;
  const pivot = new Float64Array(size);
  const x = Float64Array.from(right);
  for (let k = 0; k < size; k++) {
    const factor = k > 0 ? beside[k - 1] / pivot[k - 1] : 0;
    pivot[k] = Math.max(diagonal[k] - (k > 0 ? factor * beside[k - 1] : 0), 1e-14 * diagonal[k] + 1e-300);
    if (k > 0) x[k] -= factor * x[k - 1];
  }
  for (let k = size - 1; k >= 0; k--) {
    if (k + 1 < size) x[k] -= beside[k] * x[k + 1];
    x[k] /= pivot[k];
  }
  return x;
}
