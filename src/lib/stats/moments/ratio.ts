/**
 * numerator / denominator as the nearest double, or within one unit in the last place of it.
 *
 * @param numerator any integer
 * @param denominator positive
 * @returns 0 for 0; ±Infinity or ±0 beyond the range of doubles
 */
export function ratio(numerator: bigint, denominator: bigint): number {
  if (numerator < 0n) return -ratio(-numerator, denominator);
  if (numerator === 0n) return 0;
  // 64 to 72 bits of quotient, so that what the division drops is below a thousandth of the last place.
  const shift = 68 + bits(denominator) - bits(numerator);
  const quotient =
    shift >= 0 ? (numerator << BigInt(shift)) / denominator : numerator / (denominator << BigInt(-shift));
  // Two factors, since 2^−shift alone may underflow.
  const half = Math.trunc(shift / 2);
  return Number(quotient) * 2 ** -half * 2 ** -(shift - half);
}

/** Number of binary digits, up to 3 too many. */
function bits(value: bigint): number {
  return value.toString(16).length * 4;
}
