import type { Interval, TestResult } from '../types';
import { capital } from '../words/capital';
import { formatCount } from '../words/format-number';
import { sayInterval } from '../words/say-interval';
import { sayHowOften } from '../words/say-p';
import type { EmptyAside } from './empty-aside';

/** What the tests of the rest, its variance and its shape, say together, in two sentences. */
export function sayRest(
  verdict: EmptyAside['verdict'],
  dispersion: Interval,
  tests: TestResult[],
  alpha: number
): string {
  const measured = `With the empty shots set aside and the rest tested as counts of 1 and more, the variance is ${sayInterval(dispersion, 3)} times the ceiling of independent trials so cut`;
  const against = tests.filter(({ pAdjusted }) => pAdjusted <= alpha);
  const [telling] = [...(against.length > 0 ? against : tests)].sort((a, b) => a.p - b.p);
  const all = tests.length > 1 ? `, all ${formatCount(tests.length)} tests of the rest allowed for` : '';
  const often = ({ p, smallestP, pAdjusted }: TestResult) =>
    `${sayHowOften(pAdjusted, p <= smallestP ? pAdjusted : 0)} under independent trials so cut${all}`;
  if (verdict === 'excess') {
    const ceiling = against.find(({ id }) => id === 'ceiling') ?? telling;
    const shape = against.length > 1 ? ' The shape of the counts speaks against them as well.' : '';
    return `${measured}: the excess is there without them too. ${capital(finding(ceiling))} ${often(ceiling)}.${shape}`;
  }
  if (verdict === 'misfit')
    return `${measured}, but the counts of the rest do not fit such trials: ${finding(telling)} ${often(telling)}.`;
  if (verdict === 'compatible')
    return `${measured}: the rest keeps it, and is compatible with independent trials so cut in its shape too. The most telling of its tests: ${finding(telling)} ${often(telling)}. Compatible is not the same as independent.`;
  return tests.some(({ p, smallestP }) => p <= smallestP)
    ? `${measured}. A test of the rest is as extreme as so few resamples can show, so that it cannot be judged with them.`
    : `${measured}. The rest neither breaks it nor excludes an excess that matters, and no test of its shape speaks against independent trials so cut.`;
}

const finding = ({ id }: TestResult): string =>
  ({
    ceiling: 'a variance as large',
    fit: 'a mismatch as large with the best law',
    'high-tail': 'as many shots with large counts',
    'low-tail': 'as many shots with small counts'
  })[id as RestTest];

/** Tests that are made of the rest. */
export type RestTest = 'ceiling' | 'fit' | 'high-tail' | 'low-tail';
