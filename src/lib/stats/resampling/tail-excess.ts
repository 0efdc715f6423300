/**
 * How much heavier a tail is than a law allows: the largest signed root of the binomial deviance,
 * sign·√(2[T ln(T/SF) + (S−T) ln((S−T)/(S−SF))]), of the shots T in the tail against S·F expected, over the
 * counts from `from` outward.
 *
 * @param shots shots at counts first, first+1, …
 * @param law f at the same counts
 * @param beyond probability of the law outside these counts, on the tail's side
 * @param side `high`: T counts shots ≥ n, from the last count down to `from`; `low`: shots ≤ n, up to `from`
 * @returns the largest value, at least 0; 0 when nothing lies there
 *
 * Why not (T − SF)/√(SF(1−F)): far out, where S·F is 1e-3 say, one shot scores 30, the largest of many such
 * scores has a tail like 1/x², and an excess in the near tail is lost in it. The deviance root of the same
 * shot is 3.4, as rare as it looks (Berk & Jones 1979, from memory).
 */
export function tailExcess(
  shots: Float64Array,
  law: Float64Array,
  total: number,
  beyond: number,
  side: 'high' | 'low',
  from: number
): number {
  const step = side === 'high' ? -1 : 1;
  let seen = 0;
  let expected = beyond * total;
  let largest = 0;
  for (let i = side === 'high' ? shots.length - 1 : 0; side === 'high' ? i >= from : i <= from; i += step) {
    seen += shots[i];
    expected += total * law[i];
    if (seen > expected)
      largest = Math.max(largest, deviance(seen, Math.min(Math.max(expected, least), total), total));
  }
  return Math.sqrt(2 * largest);
}

/** An expectation that underflows to 0 would make one shot infinitely surprising. */
const least = 1e-290;

function deviance(seen: number, expected: number, total: number): number {
  const inside = seen * Math.log(seen / expected);
  const rest = total - seen;
  return rest > 0 ? inside + rest * Math.log(rest / (total - expected)) : inside;
}
