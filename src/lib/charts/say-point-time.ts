import { formatNumber } from '$lib/model/format-number';
import type { SweepReport, SweptPoint } from '$lib/stats/sweep/types';

/** Which dataset a reading is of: "ramp 3, 4 µs". */
export const sayPointTime = (
  { label, time }: Pick<SweptPoint, 'label' | 'time'>,
  { timeUnit }: Pick<SweepReport, 'timeUnit'>
): string => `${label}, ${formatNumber(time)}${timeUnit ? ` ${timeUnit}` : ''}`;
