import type { DeviceTimeline } from '$lib/model/team/devices/timeline';
import type { Table } from './table';
import { knownOf, type Quantity } from './timeline-quantities';

/** One quantity of a group version by version, in full. */
export const timelineTable = ({ points }: Pick<DeviceTimeline, 'points'>, quantity: Quantity): Table => ({
  columns: [
    { title: 'version', kind: 'text' },
    { title: 'dataset', kind: 'text' },
    { title: 'shots', kind: 'whole' },
    { title: quantity === 'dispersion' ? 'variance over ceiling' : quantity, kind: 'number' },
    { title: 'low', kind: 'number' },
    { title: 'high', kind: 'number' },
    ...(quantity === 'divergence' ? [] : [{ title: 'lower limit', kind: 'number' as const }]),
    { title: 'upper limit', kind: 'number' }
  ],
  rows: points.map((point) => {
    const known = knownOf(point, quantity);
    const ends = known ? [known.value, known.low, known.high] : [null, null, null];
    const both = known?.limits ?? [null, null];
    const limits = quantity === 'divergence' ? both.slice(1) : both;
    return [point.version, point.label, point.shots, ...ends, ...limits];
  })
});
