import { secondsIn } from './seconds-in';
import { showTimeUnit } from './show-time-unit';

export type OneTimeUnit =
  | { ok: true; unit: string; times: number[] }
  /** A reason in words. */
  | { ok: false; reason: string };

/**
 * Times of several datasets in the unit of the first, so that they can stand on one axis. Units of time are converted;
 * a unit of a laboratory's own, or none, goes only with itself.
 *
 * @param stated the time of each, and the unit it was stated in; null where nothing is stated
 * @param what "quench time" or "hold time", for the reason
 */
export function oneTimeUnit(
  stated: { label: string; time: number | null; unit: string | null }[],
  what: string
): OneTimeUnit {
  const unit = stated[0]?.unit ?? '';
  const own = secondsIn(unit);
  const times: number[] = [];
  for (const { label, time, unit: other } of stated) {
    if (time === null) return { ok: false, reason: `“${label}” states no ${what}.` };
    const seconds = secondsIn(other ?? '');
    if ((other ?? '') === unit) times.push(time);
    else if (own !== null && seconds !== null) times.push(time * (seconds / own));
    else
      return {
        ok: false,
        reason: `Units are mixed: “${stated[0].label}” has its ${what} in ${name(unit)} and “${label}” in ${name(other ?? '')}, and neither is told in the other. Give one unit.`
      };
  }
  return { ok: true, unit: showTimeUnit(unit), times };
}

const name = (unit: string): string => (unit === '' ? 'no unit' : `“${unit}”`);
