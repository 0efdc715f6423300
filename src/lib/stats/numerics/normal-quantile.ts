/** Numerator and denominator coefficients of algorithm AS 241 (PPND16), lowest power first. */
const centre = [
  [
    3.387132872796366608, 133.14166789178437745, 1971.5909503065514427, 13731.693765509461125,
    45921.953931549871457, 67265.770927008700853, 33430.575583588128105, 2509.0809287301226727
  ],
  [
    1, 42.313330701600911252, 687.1870074920579083, 5394.1960214247511077, 21213.794301586595867,
    39307.89580009271061, 28729.085735721942674, 5226.495278852854561
  ]
];
const shoulder = [
  [
    1.42343711074968357734, 4.6303378461565452959, 5.7694972214606914055, 3.64784832476320460504,
    1.27045825245236838258, 0.24178072517745061177, 0.0227238449892691845833, 7.7454501427834140764e-4
  ],
  [
    1, 2.05319162663775882187, 1.6763848301838038494, 0.68976733498510000455, 0.14810397642748007459,
    0.0151986665636164571966, 5.475938084995344946e-4, 1.05075007164441684324e-9
  ]
];
const far = [
  [
    6.6579046435011037772, 5.4637849111641143699, 1.7848265399172913358, 0.29656057182850489123,
    0.026532189526576123093, 0.0012426609473880784386, 2.71155556874348757815e-5, 2.01033439929228813265e-7
  ],
  [
    1, 0.59983220655588793769, 0.13692988092273580531, 0.0148753612908506148525, 7.868691311456132591e-4,
    1.8463183175100546818e-5, 1.4215117583164458887e-7, 2.04426310338993978564e-15
  ]
];

/**
 * Standard normal quantile: the x with P(Z ≤ x) = p.
 *
 * @param p probability
 * @returns relative error about 1e-15 for 1e-300 ≤ p < 1; ∓Infinity at 0 and 1, NaN outside. For an upper tail
 *   probability take `-normalQuantile(tail)`: 1 − tail has already lost its digits.
 *
 * Source: Wichura 1988, Applied Statistics 37:477 (AS 241). The coefficients are from memory; reference values
 * by bisection of erfc with 60 digits confirm them.
 */
export function normalQuantile(p: number): number {
  if (!(p >= 0 && p <= 1)) return NaN;
  const fromHalf = p - 0.5;
  if (Math.abs(fromHalf) <= 0.425) return fromHalf * ratio(centre, 0.180625 - fromHalf * fromHalf);
  const tail = Math.min(p, 1 - p);
  if (tail === 0) return fromHalf < 0 ? -Infinity : Infinity;
  const r = Math.sqrt(-Math.log(tail));
  const size = r <= 5 ? ratio(shoulder, r - 1.6) : ratio(far, r - 5);
  return fromHalf < 0 ? -size : size;
}

function ratio([numerator, denominator]: number[][], x: number): number {
  let above = 0;
  let below = 0;
  for (let j = numerator.length - 1; j >= 0; j--) {
    above = above * x + numerator[j];
    below = below * x + denominator[j];
  }
  return above / below;
}
