/** @throws RangeError when a value is no probability, NaN included: sorting would otherwise hide it. */
export function refuseBadP(p: ArrayLike<number>): void {
  for (let i = 0; i < p.length; i++) {
    if (!(p[i] >= 0 && p[i] <= 1)) throw new RangeError(`p-value ${i} is ${p[i]}`);
  }
}
