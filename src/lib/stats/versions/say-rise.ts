import { formatPercent } from '../words/format-number';

/**
 * A smallest rise beside the tolerance it is held to, as per cent: three digits, and as many more as it takes (seven at
 * most) for the figure to lie on the side of the tolerance where the rise lies. 0.10003 beside 0.1 is "10.003 %".
 */
export function sayRise(rise: number, tolerance: number): string {
  const side = Math.sign(rise - tolerance);
  let digits = 3;
  while (digits < 7 && Math.sign(Number(rise.toPrecision(digits)) - tolerance) !== side) digits++;
  return formatPercent(rise, digits);
}
