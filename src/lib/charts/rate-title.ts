import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '$lib/model/format-number';

/** The finding of the rate function, as a title. */
export function rateTitle({ rate, data }: Diagnosis): string {
  const seen = rate.points.filter((point) => point.empirical !== null);
  const unit = rate.scale === 1 ? 'nats a shot' : 'nats a trial';
  if (seen.length < 2) return 'One count alone draws no rate function';
  const held = seen.filter(
    ({ low, high, fitted }) => fitted !== null && low <= fitted && (high === null || fitted <= high)
  ).length;
  const agreement =
    held === seen.length
      ? 'Every seen rate agrees with the best law'
      : `${formatCount(held)} of ${formatCount(seen.length)} seen rates agree with the best law`;
  return `${agreement}; ${formatCount(data.shots)} shots show nothing beyond ${formatNumber(rate.horizon, 3)} ${unit}`;
}
