import { batchIndex } from '../order/batch-index';

/** Variance of the counts, split into what lies within batches and what lies between them. */
export interface BatchParts {
  batches: { name: string; shots: number; mean: number; variance: number | null }[];
  /** Pooled variance within batches, Σ(n − mean_b)²/(S − B). */
  within: number;
  /** Variance of the batches' true means, estimated: (MS_between − within)/n₀; below 0 by chance. */
  between: number;
  /** Sums of the third and fourth powers of the distances from each batch's own mean. */
  third: number;
  fourth: number;
  /** n₀, the size of a batch that counts for `between`. */
  size: number;
  /** Unbiased variance of all shots, S − 1 in the denominator. */
  total: number;
  /** F = MS_between/within, with its degrees of freedom. */
  ratio: { value: number; between: number; within: number };
}

/**
 * Analysis of variance of shots by batch: how much of an excess is drift between batches, and how much is left within.
 *
 * within estimates σ², MS_between estimates σ² + n₀·τ², n₀ = (S − Σn_b²/S)/(B − 1); τ² is the variance between batches.
 * Counts of independent kinks whose rate differs from batch to batch keep their ceiling within each batch, so an excess
 * that drift makes is found in `between`.
 *
 * @param shots counts in the order taken
 * @param names batch of each shot
 * @returns null for fewer than two batches, or batches of one shot each
 * @throws RangeError when the lists differ in length
 * Source: Searle, Casella & McCulloch 1992, Variance Components, ch. 3 (m).
 */
export function batchParts(shots: ArrayLike<number>, names: ArrayLike<string>): BatchParts | null {
  if (shots.length !== names.length)
    throw new RangeError(`${names.length} batches for ${shots.length} shots`);
  const { of, sizes } = batchIndex(names);
  const number = sizes.length;
  const length = shots.length;
  if (number < 2 || number === length) return null;
  const sums = new Float64Array(number);
  const label = new Array<string>(number);
  let sum = 0;
  for (let i = 0; i < length; i++) {
    sums[of[i]] += shots[i];
    label[of[i]] = names[i];
    sum += shots[i];
  }
  const mean = sum / length;
  const squares = new Float64Array(number);
  let all = 0;
  let third = 0;
  let fourth = 0;
  for (let i = 0; i < length; i++) {
    const own = shots[i] - sums[of[i]] / sizes[of[i]];
    squares[of[i]] += own * own;
    third += own * own * own;
    fourth += own * own * own * own;
    all += (shots[i] - mean) ** 2;
  }
  const inside = squares.reduce((a, b) => a + b, 0);
  let across = 0;
  let sizesSquared = 0;
  for (let b = 0; b < number; b++) {
    across += sizes[b] * (sums[b] / sizes[b] - mean) ** 2;
    sizesSquared += sizes[b] * sizes[b];
  }
  const within = inside / (length - number);
  const meanSquare = across / (number - 1);
  const size = (length - sizesSquared / length) / (number - 1);
  return {
    batches: label.map((name, b) => ({
      name,
      shots: sizes[b],
      mean: sums[b] / sizes[b],
      variance: sizes[b] > 1 ? squares[b] / (sizes[b] - 1) : null
    })),
    within,
    between: (meanSquare - within) / size,
    third,
    fourth,
    size,
    total: all / (length - 1),
    ratio: { value: meanSquare / within, between: number - 1, within: length - number }
  };
}
