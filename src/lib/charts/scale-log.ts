import { scaleLinear } from './scale-linear';

/** Scale on which equal ratios are equally far apart; both ends of the domain, and every value, above 0. */
export function scaleLog([from, to]: [number, number], range: [number, number]): (value: number) => number {
  const place = scaleLinear([Math.log(from), Math.log(to)], range);
  return (value) => place(Math.log(value));
}
