import { VERDICTS } from '$lib/model/labels';
import { formatNumber } from '$lib/model/format-number';
import type { SweepReport, SweptPoint } from '$lib/stats/sweep/types';
import { overTimePicture, type OverTimeKind } from './over-time-picture';
import type { LegendEntry, Picture, Size } from './picture';
import { sayPointTime } from './say-point-time';
import { timeTitle } from './time-title';

/** Points whose newest diagnosis told a variance over ceiling. */
export const dispersed = ({ points }: Pick<SweepReport, 'points'>) =>
  points.flatMap((point) => {
    const one = point.dataset?.dispersion;
    return one && one.value !== null ? [{ point, one: { ...one, value: one.value } }] : [];
  });

/** Variance over ceiling of each dataset along the time, drawn as what its answer is. */
export function sweepDispersionPicture(report: SweepReport, size: Size): Picture {
  const seen = dispersed(report);
  const kindOf = ({ dataset }: SweptPoint): OverTimeKind =>
    dataset?.verdict === 'ruled-out' ? 'more' : dataset?.verdict === 'undecided' ? 'unsure' : 'within';
  const kinds = new Set(seen.map(({ point }) => kindOf(point)));
  const labels: [OverTimeKind, LegendEntry][] = [
    ['more', { role: 'observed-more', label: 'independent trials ruled out' }],
    ['unsure', { role: 'observed-unsure', label: 'undecided' }],
    ['within', { role: 'observed', label: 'compatible with independent trials, with its 95 % interval' }]
  ];
  return overTimePicture(
    {
      time: timeTitle(report),
      quantity: 'variance over ceiling',
      points: seen.map(({ point, one }) => ({
        time: point.time,
        ...one,
        kind: kindOf(point),
        words: () =>
          `${sayPointTime(point, report)}: variance over ceiling ${formatNumber(one.value)}${ends(one)}${point.dataset?.verdict ? `; ${VERDICTS[point.dataset.verdict]}` : ''}.`
      })),
      levels: [{ value: 1, role: 'limit' }],
      legend: [
        ...labels.filter(([kind]) => kinds.has(kind)).map(([, entry]) => entry),
        { role: 'limit', label: 'the most that independent trials allow' }
      ],
      notes: left(report.points.length - seen.length)
    },
    size
  );
}

const ends = ({ low, high }: { low: number | null; high: number | null }): string =>
  low === null || high === null ? '' : `, 95 % interval ${formatNumber(low)} to ${formatNumber(high)}`;

const left = (number: number): string[] =>
  number > 0 ? [`${number} of the datasets had no diagnosis that told it when the sweep was made.`] : [];
