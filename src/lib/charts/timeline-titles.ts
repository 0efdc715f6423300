import { formatCount } from '$lib/model/format-number';
import type { DeviceTimeline } from '$lib/model/team/devices/timeline';
import { capital } from '$lib/model/capital';
import { knownOf, type Quantity } from './timeline-quantities';

const SHORT = { dispersion: 'variance over ceiling', mean: 'mean', divergence: 'divergence' } as const;

/** What the chart of one quantity shows, in one line. */
export function timelineTitle(
  { points, group, reference }: Pick<DeviceTimeline, 'points' | 'group' | 'reference'>,
  quantity: Quantity
): string {
  const known = points.flatMap((point) => knownOf(point, quantity) ?? []);
  const name = `${SHORT[quantity]} of ${group ?? 'the device'}`;
  if (known.length === 0) return `The ${name} is not known yet`;
  const limited = known.flatMap(({ value, limits }) => (limits ? [{ value, limits }] : []));
  if (limited.length === 0) return capital(`${name}, version by version`);
  const above = limited.filter(({ value, limits }) => value > limits[1]).length;
  const below = limited.filter(({ value, limits }) => value < limits[0]).length;
  const one = limited.length === 1;
  const of = `of ${formatCount(limited.length)} ${one ? 'version' : 'versions'} beside ${reference}`;
  if (above + below === 0)
    return `The ${name} stays within its limits in ${one ? `the one version beside ${reference}` : `all ${of.slice(3)}`}`;
  const parts = [
    ...(above > 0 ? [`rises above its limits in ${formatCount(above)}`] : []),
    ...(below > 0 ? [`falls below them in ${formatCount(below)}`] : [])
  ];
  return `The ${name} ${parts.join(' and ').replace(/^falls below them/, 'falls below its limits')} ${of}`;
}

/** What the table of marks shows at a glance. */
export function marksTitle({ marks, reference }: Pick<DeviceTimeline, 'marks' | 'reference'>): string {
  if (reference === null) return 'No version has counts yet';
  const compared = marks.flat().filter((cell) => cell !== null && cell.mark !== 'reference');
  if (compared.length === 0) return `No version has been measured beside ${reference}`;
  const all = formatCount(compared.length);
  const risen = compared.filter((cell) => cell?.mark === 'risen').length;
  if (risen > 0) return `The variance rises over ${reference} in ${formatCount(risen)} of ${all} cells`;
  const seeing = compared.filter((cell) => cell?.seesRise).length;
  if (seeing === 0) return `Nothing can be told of a rise over ${reference} yet`;
  const blind = compared.length - seeing;
  return `No rise over ${reference} is seen in ${formatCount(seeing)} of ${all} cells${blind > 0 ? `; ${formatCount(blind)} cannot tell` : ''}`;
}
