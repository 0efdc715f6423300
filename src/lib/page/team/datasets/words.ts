import { formatNumber } from '$lib/model/format-number';
import { showTimeUnit } from '$lib/model/show-time-unit';
import type { Conditions } from '$lib/model/team/datasets/conditions';

const day = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  timeZone: 'UTC'
});

/** A day as people write it, from YYYY-MM-DD or milliseconds since 1970 (UTC). */
export const sayDay = (at: string | number | null): string => (at === null ? '–' : day.format(new Date(at)));

/** "2.5 µs"; a dash when it is not stated. */
export function sayTime(time: number | null, unit: string | null): string {
  if (time === null) return '–';
  // A time is known as it was typed: closing zeros would claim digits that nobody wrote.
  const number = formatNumber(time, 6)
    .replace(/(\.\d*?)0+$/, '$1')
    .replace(/\.$/, '');
  return unit ? `${number}\u202f${showTimeUnit(unit)}` : number;
}

/** Conditions in one line, as far as they are stated. */
export function sayConditions(conditions: Conditions): string {
  const { device, firmware, group, quenchTime, quenchUnit, holdTime, holdUnit, trials, measuredOn } =
    conditions;
  const parts = [
    device,
    firmware,
    group,
    quenchTime === null ? null : `quench ${sayTime(quenchTime, quenchUnit)}`,
    holdTime === null ? null : `hold ${sayTime(holdTime, holdUnit)}`,
    trials === null ? null : `N = ${trials}`,
    measuredOn === null ? null : sayDay(measuredOn)
  ];
  return parts.filter((part) => part !== null).join(', ') || 'no conditions stated';
}
