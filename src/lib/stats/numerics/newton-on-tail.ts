/**
 * Zero of a concave function by Newton's method, for the ends of exact intervals.
 *
 * @param start where to begin
 * @param f its value and derivative at x
 * @param scale `log` for a function concave in ln x > 0: the derivative is then the one by ln x. x itself is carried
 *   along, since a logarithm near 30 has lost a digit and a half of x.
 * @returns the zero to about two units in the last place; NaN when f gives NaN
 *
 * On a concave function the step from any point lands where f ≤ 0, and all later steps move one way, so neither
 * a bracket nor damping is needed; only a start where f is all but flat would be thrown beyond the range of
 * doubles. It ends once a step is below rounding or no longer shrinks.
 */
export function newtonOnTail(
  start: number,
  f: (x: number) => [value: number, derivative: number],
  scale: 'linear' | 'log' = 'linear'
): number {
  let x = start;
  let last = Infinity;
  for (let count = 0; count < 100; count++) {
    const [value, derivative] = f(x);
    const step = value / derivative;
    if (Number.isNaN(step)) return NaN;
    const before = x;
    x = scale === 'log' ? x * Math.exp(-step) : x - step;
    const size = Math.abs(x - before);
    if (size <= 2e-16 * Math.abs(x) || (count > 3 && size >= last && size < 1e-10 * Math.abs(x))) return x;
    last = size;
  }
  return x;
}
