import { sayKept } from '$lib/stats/words/say-kept';
import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { GEOMETRIES } from '../labels';

/** "0.0100, standard uncertainty 0.0010". */
export const sayStatedRate = ({
  misread,
  misreadUncertainty
}: Pick<Diagnosis['data'], 'misread' | 'misreadUncertainty'>): string =>
  misread === null
    ? 'not stated'
    : `${formatNumber(misread, 3)}${misreadUncertainty ? `, standard uncertainty ${formatNumber(misreadUncertainty, 2)}` : ''}`;

/** What was given, as pairs of what and value. */
export function dataFacts({ data }: Diagnosis, name: string | null): [string, string][] {
  const seen = data.counts.filter(([, shots]) => shots > 0);
  const { lump, below } = data;
  const largest = lump?.from ?? seen.at(-1)?.[0] ?? 0;
  const smallest = below ? `${formatCount(below.to)} or fewer` : formatCount(seen[0]?.[0] ?? largest);
  return [
    ...(name ? [['Name', name] as [string, string]] : []),
    ['Shots', formatCount(data.shots)],
    ['Trials in a shot, N', data.trials === null ? 'unknown' : formatCount(data.trials)],
    ['Counts seen', `${smallest} to ${formatCount(largest)}${lump ? ' or more' : ''}`],
    ['Unit', data.unit === 'pair' ? 'pairs of defects: n/2 out of N/2 is tested' : 'single defects'],
    ['Counted on', GEOMETRIES[data.geometry]],
    ...(data.kept ? [['Counts kept', sayKept(data.kept)] as [string, string]] : []),
    ['Chance to misread a site', sayStatedRate(data)],
    [
      'Order of the shots',
      data.ordered ? `known${data.batches ? `, ${formatCount(data.batches)} batches` : ''}` : 'not known'
    ]
  ];
}
