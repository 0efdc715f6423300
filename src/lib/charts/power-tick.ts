/** A power of ten as an axis label: 1, 0.1, 0.01, then 10 with a raised exponent. */
export function powerTick(exponent: number): { text: string; raised?: string } {
  if (exponent >= -2 && exponent <= 3) return { text: String(10 ** exponent) };
  return { text: '10', raised: String(exponent).replace('-', '\u2212') };
}
