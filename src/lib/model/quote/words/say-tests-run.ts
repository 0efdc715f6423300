import type { TestId, TestResult } from '$lib/stats/types';
import { TESTS } from '../../labels';
import { roundToDigits } from '../numbers/round-to-digits';
import type { Quotable } from '../quotable';
import { SOURCES_BY_YEAR } from '../sources';
import { listed, math, number, text, words, type Words } from '../span';
import { counted, given, whole } from './say-number';

/** Which tests ran, where their p-values come from, and how they were adjusted. */
export function sayTestsRun(quotable: Quotable): Words[] {
  const { tests, notRun } = quotable;
  const missing = notRun.length > 0 ? [words`Not run: ${listed(notRun.map(({ id }) => NAMES[id]))}.`] : [];
  if (tests.length === 0) return [[text('No test could run.')], ...missing];
  const names = tests.map(({ id }) =>
    id === 'order' ? `${NAMES[id]} (autocorrelation, ${SOURCES_BY_YEAR.ljungBox}, and runs)` : NAMES[id]
  );
  return [
    words`${tests.length === 1 ? 'One test ran' : words`${capital(tests.length)} tests ran`}: ${listed(names)}.`,
    ...missing,
    ...origins(quotable),
    ...(tests.length > 1
      ? [
          words`The ${math('p')}-values were adjusted for all ${whole(tests.length)} tests by Holm’s method (${SOURCES_BY_YEAR.holm}).`
        ]
      : [])
  ];
}

const SMALL = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight'];
const capital = (value: number): string => SMALL[value] ?? String(value);

function origins({ data, tests, engine }: Quotable): Words[] {
  const of = (source: TestResult['source']) => tests.filter((test) => test.source === source);
  const drawn = of('resampled');
  const [permuted, limits] = [of('permuted'), of('limit')];
  const ceiling = drawn.some(({ id }) => id === 'ceiling');
  const fitted = drawn.some(({ id }) => id !== 'ceiling');
  const ways = [
    // Of misread kinks equal bonds stand in for the best law where they fit about as well.
    ...(fitted
      ? [`histograms drawn from ${data.misreadApplied ? 'a' : 'the'} fitted law, each fitted anew`]
      : []),
    ...(ceiling
      ? [
          `${fitted ? 'for the variance, ' : ''}histograms drawn from ${data.misreadApplied ? 'the most dispersed of these laws' : 'equal trials'}`
        ]
      : []),
    ...(permuted.length > 0
      ? [`${drawn.length > 0 ? `for ${namesOf(permuted)}, ` : ''}permutations of the shots`]
      : [])
  ];
  const p = math('p');
  const out: Words[] = [];
  if (ways.length > 0) {
    out.push(
      words`A ${p}-value is ${math('(k + 1)/(B + 1)')}, where ${math('k')} of ${math('B')} draws are at least as extreme as the data. Draws are ${ways.join('; ')}.`
    );
    if (engine.resamples !== null && engine.seed !== null)
      out.push(
        words`With ${counted(engine.resamples, 'draw')} at most (seed ${given(engine.seed)}) no ${p} under ${number(roundToDigits(1 / (engine.resamples + 1), 2))} can be shown.`
      );
    if (tests.some(({ stoppedEarly }) => stoppedEarly))
      out.push(
        words`Draws for a test ended at the 100th as extreme as the data, and its ${p} is then 100 over the draws made (${SOURCES_BY_YEAR.besagClifford}).`
      );
  }
  if (limits.length > 0)
    out.push(
      words`With so many shots the ${p}-value for ${namesOf(limits)} is that of a limit law, without permutations.`
    );
  return out;
}

const NAMES: Record<TestId, string> = {
  ...TESTS,
  batches: 'differences between batches',
  order: 'the order of the shots'
};

const namesOf = (tests: { id: TestId }[]): string => tests.map(({ id }) => NAMES[id]).join(' and ');
