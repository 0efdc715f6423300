/** Seconds in a unit of time; null for a unit of a laboratory's own, which compares only with itself. */
export function secondsIn(unit: string): number | null {
  return { ns: 1e-9, µs: 1e-6, us: 1e-6, ms: 1e-3, s: 1 }[unit] ?? null;
}
