import { formatNumber } from '$lib/model/format-number';
import { FLAGS } from '$lib/model/labels';
import { sayHowOften } from '$lib/model/say-p';
import type { Diagnosis, Flag, TestId, TestResult } from '$lib/stats/types';

/** One line of the tests chart. Where `at` is null nothing stands on the scale and `instead` says why. */
export interface ForestRow {
  label: string;
  kind: 'within' | 'more' | 'fewer' | 'unsure';
  /** p to which and from which the stroke runs. */
  at: number | null;
  from: number | null;
  smallest: number | null;
  instead: string;
  words: () => string;
}

type Names = Record<TestId, string>;

/** The tests one by one, and the exact certificate where there is one. */
export function testRows({ tests, tails, engine }: Diagnosis, names: Names): ForestRow[] {
  const rows = tests.map((test): ForestRow => ({
    label: names[test.id],
    kind: test.pAdjusted <= engine.alpha ? 'more' : 'within',
    at: test.pAdjusted,
    from: test.p,
    smallest: test.smallestP,
    instead: '',
    words: () => sayTestRow(test, names)
  }));
  const { certificate } = tails;
  if (!certificate) return rows;
  const { p } = certificate;
  const words = () =>
    `Exact certificate: independent trials reach such a tail with p = ${formatNumber(p, 2)} at most, without fit or simulation.`;
  const kind = p <= engine.alpha ? 'more' : 'within';
  return [...rows, { label: 'exact certificate', kind, at: p, from: p, smallest: null, instead: '', words }];
}

/** What they point to: each flag from the least to the most telling of its tests. */
export function flagRows(diagnosis: Diagnosis, names: Names): ForestRow[] {
  return diagnosis.flags.map((flag): ForestRow => {
    const ps = flag.tests.flatMap((id) => telling(id, diagnosis));
    const grade = flag.grade === 'shown' ? 'shown' : 'hinted at';
    const by = flag.tests.length ? `, by ${flag.tests.map((id) => names[id]).join(' and ')}` : '';
    return {
      label: `${FLAGS[flag.id]} ${grade}`,
      kind: kindOf(flag),
      at: ps.length ? Math.min(...ps) : null,
      from: ps.length ? Math.max(...ps) : null,
      smallest: null,
      instead: ps.length ? '' : 'by size alone',
      words: () => `${FLAGS[flag.id]} ${grade}${by}. ${flag.size}`
    };
  });
}

function kindOf({ id, grade }: Flag): ForestRow['kind'] {
  if (id === 'regular') return 'fewer';
  return grade === 'shown' ? 'more' : 'unsure';
}

/** p of a test with all tests allowed for; a certificate at the level stands for its tail. */
function telling(id: TestId, { tests, tails, engine }: Diagnosis): number[] {
  const { certificate } = tails;
  const test = tests.find((one) => one.id === id);
  const exact =
    certificate && certificate.p <= engine.alpha && id === `${certificate.side}-tail` ? [certificate.p] : [];
  const all = [...(test ? [test.pAdjusted] : []), ...exact];
  return all.length ? [Math.min(...all)] : [];
}

const sayTestRow = (test: TestResult, names: Names): string =>
  `${names[test.id]}: by itself such a result ${sayHowOften(test.p, test.smallestP)} if defects formed independently ` +
  `(p = ${formatNumber(test.p, 2)}); with all tests allowed for, p = ${formatNumber(test.pAdjusted, 2)}.`;
