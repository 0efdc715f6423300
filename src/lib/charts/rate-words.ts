import type { RatePoint } from '$lib/stats/types';
import { formatCount, formatNumber } from '$lib/model/format-number';

const number = (value: number | null): string => (value === null ? 'no value' : formatNumber(value, 3));

/** One rate read out in words. `scale` is N, or 1 when rates are per shot. */
export function rateWords(point: RatePoint, scale: number): string {
  const unit = scale === 1 ? 'nats a shot' : 'nats a trial';
  const where = point.density === null ? '' : `, density ${formatNumber(point.density, 3)}`;
  const seen =
    point.empirical === null
      ? `never seen, rate at least ${number(point.low)} ${unit}`
      : `rate ${number(point.empirical)} ${unit} (95 % interval ${number(point.low)} to ${
          point.high === null ? 'no upper limit' : number(point.high)
        })`;
  return (
    `Count ${formatCount(point.count)}${where}: ${seen}. Best law ${number(point.fitted)}, ` +
    `limit ${number(point.limit)}, Gaussian ${number(point.gaussian)}.`
  );
}
