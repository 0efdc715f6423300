/**
 * A number as people type it: `0.05`, `0,05`, `1e-3`, `1 999` with any space between thousands. A minus may be a
 * hyphen, a minus sign or the dash that pages print for one.
 * @returns null when it is not a number
 */
export function readNumber(typed: string): number | null {
  const bare = typed.replace(/[\s\u2009\u202f\u00a0]/g, '').replace(/^[\u2212\u2013]/, '-');
  const dotted = /^[^.,]*,[^.,]*$/.test(bare) ? bare.replace(',', '.') : bare;
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(dotted) ? Number(dotted) : null;
}
