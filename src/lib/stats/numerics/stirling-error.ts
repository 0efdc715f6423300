/** δ(0) … δ(15), 17 digits; made and checked by fixtures/reference/special.py. δ(0) is the limit. */
const smallIntegers = [
  Infinity,
  0.08106146679532726,
  0.0413406959554093,
  0.02767792568499834,
  0.020790672103765093,
  0.016644691189821193,
  0.013876128823070748,
  0.01189670994589177,
  0.010411265261972096,
  0.009255462182712733,
  0.00833056343336287,
  0.007573675487951841,
  0.00694284010720953,
  0.006408994188004207,
  0.0059513701127588475,
  0.005554733551962801
];

/**
 * Error of Stirling's formula, δ(n) = ln Γ(n+1) − (n + ½) ln n + n − ½ ln 2π.
 *
 * @param n any real n ≥ 0
 * @returns 1/(12n) − 1/(360n³) + …, absolute error below 1e-15; Infinity at 0, NaN for n < 0.
 *
 * From 16 on five terms of the series are exact in double precision; below that whole numbers come from a
 * table and others climb to 16 by δ(n) − δ(n+1) = (n + ½) ln(1 + 1/n) − 1.
 * Source: Loader 2000, Fast and accurate computation of binomial probabilities.
 */
export function stirlingError(n: number): number {
  if (n < 16) {
    if (Number.isInteger(n) && n >= 0) return smallIntegers[n];
    if (!(n > 0)) return NaN;
    let climbed = 0;
    let x = n;
    for (; x < 16; x++) climbed += (x + 0.5) * Math.log1p(1 / x) - 1;
    return climbed + series(x);
  }
  return series(n);
}

function series(n: number): number {
  const s = 1 / (n * n);
  return (1 / 12 - (1 / 360 - (1 / 1260 - (1 / 1680 - s / 1188) * s) * s) * s) / n;
}
