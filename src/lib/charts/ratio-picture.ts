import { formatNumber } from '$lib/model/format-number';
import { KNOWN_LAWS, RATIO_NAMES } from '$lib/model/team/sweeps/ratio-names';
import type { KnownInterval, SteadyReport, SweepReport } from '$lib/stats/sweep/types';
import { overTimePicture, type OverTime } from './over-time-picture';
import type { LegendEntry, Picture, Role, Size } from './picture';
import { ratioPoints } from './ratio-points';
import { sayPointTime } from './say-point-time';
import { timeTitle } from './time-title';

const ROLES: Record<string, Role> = {
  'landau-zener': 'limit',
  coarsening: 'mean-bound',
  'rare-events': 'level'
};

/** A ratio of cumulants over the time of a sweep, with its one value over the window and the known laws as lines. */
export function ratioPicture(report: SweepReport, steady: SteadyReport, size: Size): Picture {
  const name = RATIO_NAMES[steady.id];
  const seen = ratioPoints(report, steady.id);
  const { from, to } = report.window;
  const near = steady.references.filter(isNear(seen.map(({ one }) => one)));
  const lines = near.flatMap(({ id, value, error }): OverTime['levels'] => {
    const role = ROLES[id] ?? 'limit';
    return error > 0
      ? [
          { value: value - error, role },
          { value: value + error, role }
        ]
      : [{ value, role }];
  });
  const legend: LegendEntry[] = [
    { role: 'observed', label: 'in the window, with its 95 % interval' },
    ...(seen.some(({ point }) => !point.inWindow)
      ? [{ role: 'law' as const, label: 'outside the window' }]
      : []),
    { role: 'fitted', label: `one value over the window, ${formatNumber(steady.steady.value)}` },
    ...near.map(({ id, value, error }) => ({
      role: ROLES[id] ?? ('limit' as const),
      label: `${KNOWN_LAWS[id] ?? id}, ${formatNumber(value)}${error > 0 ? ` ± ${formatNumber(error)}` : ''}`
    }))
  ];
  return overTimePicture(
    {
      time: timeTitle(report),
      quantity: name,
      points: seen.map(({ point, one }) => ({
        time: point.time,
        ...one,
        kind: point.inWindow ? 'within' : 'outside',
        words: () =>
          `${sayPointTime(point, report)}: ${name} ${formatNumber(one.value)}, 95 % interval ${formatNumber(one.low)} to ${formatNumber(one.high)}${point.inWindow ? '' : ', outside the window'}.`
      })),
      levels: [...lines, { value: steady.steady.value, role: 'fitted', from, to }],
      legend,
      notes: steady.references
        .filter((law) => !near.includes(law))
        .map(({ id, value }) => `${KNOWN_LAWS[id] ?? id}, ${formatNumber(value)}, lies outside the chart.`)
    },
    size
  );
}

/** Whether a law lies within reach of the points: one far off would press them flat. */
function isNear(seen: KnownInterval[]): (law: { value: number; inside: boolean }) => boolean {
  const [low, high] = [Math.min(...seen.map((one) => one.low)), Math.max(...seen.map((one) => one.high))];
  return ({ value, inside }) => inside || (value > 2 * low - high && value < 2 * high - low);
}
