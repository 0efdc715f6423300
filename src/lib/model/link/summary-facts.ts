import { sayKept } from '$lib/stats/words/say-kept';
import { formatCount } from '../format-number';
import { GEOMETRIES } from '../labels';
import { lumpWords } from '../lump-words';
import { sayStatedRate } from '../report/data-facts';
import type { Summary } from './summary';

/** What was given, as pairs of what and value, where the counts are kept back. */
export const summaryFacts = ({ data }: Summary): [string, string][] => [
  ['Shots', formatCount(data.shots)],
  ['Trials in a shot, N', data.trials === null ? 'unknown' : formatCount(data.trials)],
  ['Unit', data.unit === 'pair' ? 'pairs of defects: n/2 out of N/2 is tested' : 'single defects'],
  ['Counted on', GEOMETRIES[data.geometry]],
  ...(data.kept ? [['Counts kept', sayKept(data.kept)] as [string, string]] : []),
  ['Chance to misread a site', sayStatedRate(data)],
  ['Order of the shots', data.ordered ? 'known' : 'not known'],
  ...(data.lumped && !data.opening
    ? ([['Last row', 'lumps counts: mean and variance are lower limits']] as [string, string][])
    : []),
  ...(data.opening
    ? ([['Lumped counts', lumpWords({ above: data.lumped, below: true }).limits]] as [string, string][])
    : [])
];
