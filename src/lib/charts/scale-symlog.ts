import { scaleLinear } from './scale-linear';

/** Straight near 0 and logarithmic far out: places by log(1 + |value|) with the sign of the value. */
export function scaleSymlog(
  [from, to]: [number, number],
  range: [number, number]
): (value: number) => number {
  const place = scaleLinear([bent(from), bent(to)], range);
  return (value) => place(bent(value));
}

const bent = (value: number): number => Math.sign(value) * Math.log1p(Math.abs(value));
