/** Units of time as they are written, and what they are called here. */
const units: [RegExp, string][] = [
  [/^(ns|nsec|nanoseconds?|nanosec)$/i, 'ns'],
  [/^(us|µs|μs|usec|µsec|microseconds?|microsec)$/i, 'µs'],
  [/^(ms|msec|milliseconds?|millisec)$/i, 'ms'],
  [/^(s|sec|seconds?)$/i, 's']
];

/** The usual name of a unit of time; a unit of one's own stays as it is written. */
export function timeUnit(written: string): string {
  const bare = written.trim();
  return units.find(([pattern]) => pattern.test(bare))?.[1] ?? bare;
}

/**
 * A time from a cell and the name of its column: "2.5 µs", or "2.5" under "quench time (us)" or "quench_us".
 *
 * @returns null when the cell is not one number from 0 up with at most a unit behind it
 */
export function readTime(cell: string, name: string): { time: number; unit: string | null } | null {
  const found = /^\s*(\d+(?:[.,]\d+)?(?:e[+-]?\d+)?)\s*(\D.*)?$/i.exec(cell);
  if (!found) return null;
  const time = Number(found[1].replace(',', '.'));
  if (!Number.isFinite(time)) return null;
  if (found[2]) return { time, unit: timeUnit(found[2]).slice(0, 20) };
  const bracket = /[([]\s*([^)\]]+?)\s*[)\]]\s*$/.exec(name)?.[1];
  if (bracket) return { time, unit: timeUnit(bracket).slice(0, 20) };
  const last = name.split(/[\s_.-]+/).pop() ?? '';
  return { time, unit: units.some(([pattern]) => pattern.test(last)) ? timeUnit(last) : null };
}
