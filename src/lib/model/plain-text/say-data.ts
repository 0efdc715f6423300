import { sayKept } from '$lib/stats/words/say-kept';
import type { Diagnosis } from '$lib/stats/types';
import { formatCount, formatNumber } from '../format-number';
import { sayStatedRate } from '../report/data-facts';
import { GEOMETRIES, UNITS } from '../labels';
import { sayInterval } from '../say-interval';
import { sayLumpedLimits } from '../report/say-lumped-limits';
import { wrap } from './wrap';

/** What was given, and the mean and variance found in it. */
export function sayData(document: Diagnosis, about: string[]): string {
  const { data, moments, engine } = document;
  const trials =
    data.trials === null
      ? 'trials unknown'
      : `${formatCount(data.trials)} ${data.trials === 1 ? 'trial' : 'trials'}`;
  const order = data.ordered
    ? data.batches === null
      ? '; shots in order'
      : `; shots in order, in ${formatCount(data.batches)} batches`
    : '';
  const last = data.counts.at(-1)?.[0];
  const lowest = data.below && `counts from "${formatCount(data.below.to)} or fewer"`;
  const range = data.lump
    ? `${lowest ? `${lowest} to` : 'counts up to'} "${formatCount(data.lump.from)} or more"`
    : `${lowest ? `${lowest} on, ` : ''}largest count ${formatCount(last ?? null)}`;
  const misread =
    (data.kept ? `; only ${sayKept(data.kept)} were kept` : '') +
    (data.misread === null ? '' : `; a site is misread with probability ${sayStatedRate(data)}`);
  const per = data.unit === 'pair' ? ' (in pairs)' : '';
  return [
    'Data',
    wrap(
      `${formatCount(data.shots)} ${data.shots === 1 ? 'shot' : 'shots'}, ${trials} (${GEOMETRIES[data.geometry]}), counted in ${UNITS[data.unit]}; ${range}${order}${misread}.`,
      '  '
    ),
    ...about.map((line) => wrap(line, '  ')),
    wrap(`Mean${per} ${sayInterval(moments.mean)}, variance ${sayInterval(moments.variance)}.`, '  '),
    ...sayLumpedLimits(document).map((line) => wrap(line, '  ')),
    wrap(
      `Variance over the ceiling of independent trials, ${formatNumber(moments.ceiling)}: ${sayInterval(moments.dispersion)}.`,
      '  '
    ),
    wrap(
      `Level ${engine.alpha}, tolerance ${engine.tolerance}, at most ${formatCount(engine.resamples)} resamples, seed ${engine.seed}, engine ${engine.version}.`,
      '  '
    ),
    `  Histogram ${data.digest}`
  ].join('\n');
}
