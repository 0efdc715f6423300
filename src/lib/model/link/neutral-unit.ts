/** Units of time as people write them. */
const KNOWN =
  /^(ps|ns|µs|μs|us|ms|s|min|h|picoseconds?|nanoseconds?|microseconds?|milliseconds?|seconds?|minutes?|hours?|[µμ]s\/site|1\/J|ħ\/J|hbar\/J)$/i;

/** A unit that names nobody: known units of time as they are; anything else, which people typed freely, is left out. */
export function neutralUnit(unit: string | null): string | null {
  return unit !== null && KNOWN.test(unit.trim()) ? unit.trim() : null;
}
