/**
 * ln(1 − e^x) for x ≤ 0: the log of a probability from the log of its complement.
 *
 * @returns relative error about 1e-16; −Infinity at 0, NaN above.
 *
 * expm1 while e^x is above ½, log1p below, so that no digits cancel.
 * Source: Mächler 2012, Accurately computing log(1 − exp(−|a|)).
 */
export function logOneMinusExp(x: number): number {
  return x > -Math.LN2 ? Math.log(-Math.expm1(x)) : Math.log1p(-Math.exp(x));
}
