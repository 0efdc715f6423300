/**
 * A number as people type it: `0.05`, `0,05`, `1e-3`, `1 999` with any space between thousands.
 * @returns null when it is not a number
 */
export function typedNumber(typed: string): number | null {
  const bare = typed.replace(/\s/g, '').replace(/^\u2212/, '-');
  const dotted = /^[^.,]*,[^.,]*$/.test(bare) ? bare.replace(',', '.') : bare;
  return /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(dotted) ? Number(dotted) : null;
}
