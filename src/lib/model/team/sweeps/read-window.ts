/** A window from an address, `?from=1&to=20`; null where either is missing, no number above 0, or out of order. */
export function readWindow(search: URLSearchParams): { from: number; to: number } | null {
  const [from, to] = ['from', 'to'].map((name) => Number(search.get(name) || NaN));
  return from > 0 && to >= from && to < Infinity ? { from, to } : null;
}
