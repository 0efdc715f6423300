import { formatCount, formatNumber } from '../format-number';
import { showTimeUnit } from '../show-time-unit';

/** A time of the experiment with its unit, or that its unit is not told; '' when no time is stated. */
export const sayTime = (value: number | null | undefined, unit: string | null | undefined): string =>
  value === null || value === undefined
    ? ''
    : `${Number.isInteger(value) ? formatCount(value) : formatNumber(value)}${unit ? `\u202f${showTimeUnit(unit)}` : ' (unit not told)'}`;
