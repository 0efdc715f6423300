import type { Quotable } from '../quotable';
import { emphasis, equation, text, words, type Words } from '../span';
import { asGiven } from '../numbers/as-given';
import { counted, givenPercent, whole } from './say-number';
import { testedTrials, thing } from './units';

/** The answer in one sentence, with shots and trials. */
export function sayAnswer(quotable: Quotable): Words {
  const { answer, data, engine, moments } = quotable;
  const one = data.shots === 1;
  const shots = words`${counted(data.shots, 'shot')} ${trials(quotable)}`;
  if (answer.verdict === 'ruled-out')
    return words`The counts of ${shots} ${emphasis('rule out independent trials')}.`;
  if (answer.verdict === 'compatible')
    return words`The counts of ${shots} are ${emphasis('compatible with independent trials')}.`;
  const why =
    moments.variance.value === null
      ? [text('one shot has no spread to compare with anything')]
      : moments.mean.value === 0
        ? [text(`no ${thing(quotable)} was seen`)]
        : moments.variance.value === 0
          ? [text('every shot had the same count, which leaves no spread to test')]
          : atTheEnd(quotable) > 0
            ? words`${atTheEnd(quotable) === 1 ? 'one test is' : words`${whole(atTheEnd(quotable))} tests are`} as extreme as so few draws can show`
            : words`they neither rule out independent trials nor exclude an excess of ${givenPercent(engine.tolerance)} over the variance that such trials allow`;
  return words`The counts of ${shots} leave it ${emphasis('undecided')} whether ${one ? 'the count' : 'they'} can be ${one ? 'a sum' : 'sums'} of independent trials: ${why}.`;
}

/** Tests at the smallest p that their draws can show and still not at the level: the answer waits for more draws. */
const atTheEnd = ({ tests, engine }: Quotable): number =>
  tests.filter(({ atSmallest, pAdjusted }) => atSmallest && pAdjusted > engine.alpha).length;

function trials(quotable: Quotable): Words {
  const tested = testedTrials(quotable);
  if (tested === null) return [text('with an unknown number of trials')];
  const many = tested === 1 ? '' : 's';
  const each = quotable.data.shots === 1 ? '' : ' each';
  return quotable.data.unit === 'pair'
    ? words`of ${equation('N/2', '=', asGiven(tested))} possible pair${many}${each}`
    : words`of ${equation('N', '=', asGiven(tested))} trial${many}${each}`;
}
