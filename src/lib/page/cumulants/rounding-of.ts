/**
 * Half a unit of the last digit of a number as it was typed: what rounding leaves open at least. Closing zeros of a whole
 * number count as digits.
 *
 * @returns null for what is not a number
 */
export function roundingOf(typed: string): number | null {
  const bare = typed.replace(/[\s\u2009\u202f\u00a0]/g, '');
  const found = /^[+\-\u2212\u2013]?(?=[.,]?\d)\d*(?:[.,](\d*))?(?:e([+-]?\d+))?$/i.exec(bare);
  if (!found) return null;
  // Read as text: 0.5 · 10^-2 by a power would differ from 0.005 in its last digit.
  return Number(`5e${Number(found[2] ?? 0) - (found[1]?.length ?? 0) - 1}`);
}
