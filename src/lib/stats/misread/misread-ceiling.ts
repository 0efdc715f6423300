import { pathSolve } from './path-solve';

/** The most that independent kinks can vary, once read with misread sites. */
export interface MisreadCeiling {
  /** Largest variance, or an upper bound of it. */
  variance: number;
  /** Kink probabilities along the chain that reach it; null for an upper bound that nothing need reach. */
  kinks: Float64Array | null;
}

/**
 * Largest variance of the counts of independent kinks on an open chain of N bonds whose sites are misread with
 * probability ε, as a function of the mean count as read.
 *
 * With m_k = 1 − 2p_k and u = 1 − 2ε the variance is ¼[N − mᵀA m], A = u⁴ on the diagonal and −u²(1 − u²) beside it
 * (see chainMoments), and the mean fixes Σm = (N − 2·mean)/u². A is positive definite for u² ≥ 2/3 (ε ≤ 0.0917).
 * Then mᵀA m is convex and its least value with that sum is at A m = λ·1, all m alike but for the ends, or, where that
 * would take m beyond 1, at m = 1 in the middle and A m = λ·1 on free bonds at either end. For larger ε an upper
 * bound: mᵀA m ≥ u²(3u² − 2)Σm² and Σm² ≤ N.
 *
 * @param bonds N ≥ 1
 * @param rate ε, 0 ≤ ε < ½
 * @returns a function of the mean. A mean that no kinks can give (below the misreads alone, N·2ε(1 − ε), or that far
 *   from N) is moved to the nearest that some can; for ε = 0 it is the plain ceiling, mean(1 − mean/N)
 */
export function misreadCeiling(bonds: number, rate: number): (mean: number) => MisreadCeiling {
  const lost = 4 * rate * (1 - rate);
  const square = 1 - lost;
  const diagonal = square * square;
  const beside = square * lost;
  if (square < 2 / 3) {
    const bound = (bonds + square * (2 - 3 * square) * bonds) / 4;
    return () => ({ variance: bound, kinks: null });
  }
  const free = pathSolve(diagonal, beside, new Float64Array(bonds).fill(1));
  const total = free.reduce((sum, x) => sum + x, 0);
  const largest = free.reduce((most, x) => Math.max(most, x), 0);
  return (mean) => {
    const wanted = Math.max(-bonds, Math.min(bonds, (bonds - 2 * mean) / square));
    // More kinks than not is the same problem mirrored, m → −m.
    const sum = Math.abs(wanted);
    const within = (sum * largest) / total <= 1;
    const m = within ? free.map((x) => (x * sum) / total) : bounded(bonds, sum, diagonal, beside);
    return {
      variance: (bonds - form(m, diagonal, beside)) / 4,
      kinks: m.map((x) => (1 - Math.sign(wanted || 1) * x) / 2)
    };
  };
}

/** mᵀA m. */
function form(m: Float64Array, diagonal: number, beside: number): number {
  let own = 0;
  let shared = 0;
  for (let k = 0; k < m.length; k++) {
    own += m[k] * m[k];
    if (k > 0) shared += m[k] * m[k - 1];
  }
  return diagonal * own - 2 * beside * shared;
}

/**
 * The profile with its middle held at 1: the fewest free bonds at either end for which none of the held ones wants
 * to fall. The ends feel the middle over a few bonds only, so the search ends soon.
 */
function bounded(bonds: number, sum: number, diagonal: number, beside: number): Float64Array {
  for (let ends = 1; 2 * ends < bonds; ends++) {
    // A m = λ·1 on the free end next to a bond at 1: m = λ·x + y.
    const x = pathSolve(diagonal, beside, new Float64Array(ends).fill(1));
    const pull = new Float64Array(ends);
    pull[ends - 1] = beside;
    const y = pathSolve(diagonal, beside, pull);
    const sumOf = (values: Float64Array) => values.reduce((a, b) => a + b, 0);
    const slope = ((sum - (bonds - 2 * ends)) / 2 - sumOf(y)) / sumOf(x);
    const inner = slope * x[ends - 1] + y[ends - 1];
    const held = bonds - 2 * ends;
    // λ less what the outermost held bond feels; every other held bond feels less.
    const feels = diagonal - beside * (inner + (held > 1 ? 1 : inner));
    if (slope >= feels - 1e-12 && inner <= 1 + 1e-12) {
      const m = new Float64Array(bonds).fill(1);
      for (let k = 0; k < ends; k++) m[k] = m[bonds - 1 - k] = slope * x[k] + y[k];
      return m;
    }
  }
  // Only rounding, where one bond in the middle is just at 1, leads here; all alike is then as good to the last digits.
  return new Float64Array(bonds).fill(sum / bonds);
}
