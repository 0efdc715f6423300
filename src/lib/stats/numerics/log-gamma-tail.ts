import { centralTail } from './central-tail';
import { continuedFraction } from './continued-fraction';
import { logOneMinusExp } from './log-one-minus-exp';
import { logPoissonPmf } from './log-poisson-pmf';

/**
 * ln of the regularised incomplete gamma functions: P(a, x) (`lower`) or Q(a, x) = 1 − P (`upper`).
 *
 * @param a shape > 0, any real number
 * @param x argument ≥ 0
 * @returns ≤ 0; the function has a relative error of about 1e-13 down to 1e-300, below that the log has one of
 *   1e-15; NaN outside the domain.
 *
 * For whole a, P(a, x) is P(Poisson(x) ≥ a). Below x = a the lower function, above it the upper one, is
 * computed by its continued fraction, the other as the complement; within 1.5 standard deviations at x > 1000
 * by the contour integral of `centralTail`, which for fractions of a differs by less than e^{−1000}.
 * Sources: Didonato & Morris 1992 (eq. 9 in the limit of many trials); Legendre's fraction, Abramowitz &
 * Stegun 6.5.31 in its even form.
 */
export function logGammaTail(side: 'lower' | 'upper', a: number, x: number): number {
  if (!(a > 0 && a < Infinity && x >= 0)) return NaN;
  if (x === 0) return side === 'lower' ? -Infinity : 0;
  if (x === Infinity) return side === 'lower' ? 0 : -Infinity;
  const direct = a >= x ? logLower(a, x) : logUpper(a, x);
  return (side === 'lower') === a >= x ? direct : logOneMinusExp(direct);
}

/** ln P(a, x), a ≥ x. */
function logLower(a: number, x: number): number {
  const excess = a - x;
  if (x >= 1000 && excess < 1.5 * Math.sqrt(x)) return Math.log(centralTail(excess, x, 1, 0));
  const fraction = continuedFraction((a * (excess + 1)) / (a + 1), (j, into) => {
    const middle = a + 2 * j;
    const share = (j * x) / (middle - 1);
    into.numerator = (share * (a + j - 1) * x) / (middle - 1);
    into.denominator = j + share + ((a + j) * (excess + 1 + 2 * j)) / (middle + 1);
  });
  return logPoissonPmf(a, x) + Math.log(a * fraction);
}

/** ln Q(a, x), x > a. */
function logUpper(a: number, x: number): number {
  const excess = x - a;
  // Q counts up to a − 1, hence the 1.
  if (x >= 1000 && excess + 1 < 1.5 * Math.sqrt(x)) return Math.log(centralTail(excess + 1, x, -1, 0));
  const fraction = continuedFraction(excess + 1, (j, into) => {
    into.numerator = j * (a - j);
    into.denominator = excess + 1 + 2 * j;
  });
  return logPoissonPmf(a, x) + Math.log(a * fraction);
}
