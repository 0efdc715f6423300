/** One stretch of shots for a chart of the mean over time. */
export interface MeanPoint {
  /** Shots `from` … `to` − 1. */
  from: number;
  to: number;
  mean: number;
  /** Three standard errors around the mean of all shots. */
  low: number;
  high: number;
  outside: boolean;
}

/**
 * Means of consecutive stretches of shots with three-sigma control limits, for a chart. The standard error is taken from
 * differences of neighbouring shots, Σ(n_{i+1} − n_i)²/(2(S − 1)): drift widens a variance, but hardly these.
 *
 * @param shots counts in the order taken
 * @param stretch shots in each point, ≥ 1; what is left over at the end joins the last
 * @returns nothing for fewer than two stretches
 * Source: Shewhart 1931 (limits); von Neumann, Kent, Bellinson & Hart 1941 (differences) (m).
 */
export function runningMean(shots: ArrayLike<number>, stretch: number): MeanPoint[] {
  const points = Math.floor(shots.length / stretch);
  if (!Number.isInteger(stretch) || stretch < 1 || points < 2) return [];
  let sum = 0;
  let steps = 0;
  for (let i = 0; i < shots.length; i++) {
    sum += shots[i];
    if (i > 0) steps += (shots[i] - shots[i - 1]) ** 2;
  }
  const mean = sum / shots.length;
  const spread = Math.sqrt(steps / (2 * (shots.length - 1)));
  return Array.from({ length: points }, (_, k) => {
    const from = k * stretch;
    const to = k === points - 1 ? shots.length : from + stretch;
    let part = 0;
    for (let i = from; i < to; i++) part += shots[i];
    const here = part / (to - from);
    const reach = (3 * spread) / Math.sqrt(to - from);
    return {
      from,
      to,
      mean: here,
      low: mean - reach,
      high: mean + reach,
      outside: Math.abs(here - mean) > reach
    };
  });
}
