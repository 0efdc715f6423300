import { plainLogLikelihood, plainPmf, type Problem } from './plain';

/**
 * Best probabilities by cyclic coordinate ascent from one start: slow, but it shares nothing with the search under
 * test and cannot be trapped along a coordinate, since the likelihood is concave in each p_k alone.
 */
export function coordinateAscent(shots: number[], start: number[]): number {
  const problem: Problem = { shots, trials: start.length };
  const p = [...start];
  let value = plainLogLikelihood(problem, p);
  for (let sweep = 0; sweep < 400; sweep++) {
    const before = [...p];
    for (let k = 0; k < p.length; k++) p[k] = bestAlone(shots, plainPmf(without(p, k)));
    // Coordinate steps creep along ridges; a leap along the last sweep's direction is taken when it gains.
    const here = plainLogLikelihood(problem, p);
    for (const leap of sweep % 4 === 3 ? [32, 8, 2] : []) {
      const far = p.map((one, k) => Math.min(1, Math.max(0, one + leap * (one - before[k]))));
      if (plainLogLikelihood(problem, far) > here) {
        far.forEach((one, k) => (p[k] = one));
        break;
      }
    }
    const next = plainLogLikelihood(problem, p);
    if (sweep > 20 && next - value < 1e-10) break;
    value = next;
  }
  return plainLogLikelihood(problem, p);
}

function without(p: number[], k: number): number[] {
  return p.filter((_, j) => j !== k);
}

/** Maximum of Σ h ln(g_n(1−p) + g_{n−1}p) over 0 ≤ p ≤ 1, by halving on the slope. */
function bestAlone(shots: number[], g: number[]): number {
  const slope = (p: number) => {
    let sum = 0;
    shots.forEach((h, n) => {
      if (h === 0) return;
      const here = g[n] ?? 0;
      const change = (n > 0 ? g[n - 1] : 0) - here;
      sum += (h * change) / (here + change * p);
    });
    return sum;
  };
  const [atLow, atHigh] = [slope(0), slope(1)];
  if (Number.isFinite(atLow) && !(atLow > 0)) return 0;
  if (Number.isFinite(atHigh) && atHigh > 0) return 1;
  let [low, high] = [0, 1];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (slope(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
