import { capital } from '../../capital';
import { roundToDigits } from '../numbers/round-to-digits';
import type { Quotable, QuotableTest } from '../quotable';
import { number, words, type Words } from '../span';
import { sayHowOften } from '../../say-p';
import { sayMisread } from './say-misread';
import { counted, sayPValue, whole } from './say-number';
import { thing } from './units';

/** How surprising the counts are: the certificate where it decides, and the leading test; the number after the words. */
export function sayEvidence(quotable: Quotable): Words[] {
  const { certificate, tests, engine } = quotable;
  const out: Words[] = [];
  if (certificate && certificate.p <= engine.alpha) out.push(certified(quotable));
  const leading = [...tests].sort((a, b) => a.pAdjusted - b.pAdjusted || a.p - b.p)[0];
  if (leading) out.push(tested(leading, quotable));
  return out;
}

function certified(quotable: Quotable): Words {
  const { certificate, data } = quotable;
  const { p, side, count, bound, shots } = certificate!;
  return words`With a mean within its limits no independent trials, whatever their probabilities${sayMisread(quotable)}, give a shot ${whole(count)}${side === 'high' ? ' or more' : count === 0 ? '' : ' or fewer'} ${thing(quotable)}s with a chance above ${number(roundToDigits(bound, 2))}, and ${whole(shots)} of ${whole(data.shots)} shots have them: so heavy a tail ${often(p, true)} (exact certificate, ${sayPValue(p, true)}).`;
}

/** How often, from p as it is printed: "in 19 of 100" beside "p = 0.18" would look like a mistake. */
function often(p: number, atMost: boolean): string {
  const printed = Number(p.toPrecision(2));
  return sayHowOften(printed, atMost ? printed : 0);
}

const FINDINGS: Record<QuotableTest['id'], string> = {
  ceiling: 'counts this uneven',
  fit: 'a mismatch this large with the best law',
  'high-tail': 'this many shots with large counts',
  'low-tail': 'this many shots with small counts',
  parity: 'a preference this strong for one parity',
  'empty-shots': 'this many empty shots',
  batches: 'batches this different',
  order: 'an order this far from chance'
};

function tested(test: QuotableTest, { tests }: Quotable): Words {
  const { id, p, pAdjusted, atSmallest, resamples, limits } = test;
  const many = tests.length > 1;
  const if_ = id === 'batches' || id === 'order' ? 'all shots were alike' : 'defects formed independently';
  const from =
    limits !== null
      ? words`; its draws leave it between ${number(roundToDigits(limits.low!, 2))} and ${number(roundToDigits(limits.high!, 2))}`
      : atSmallest && resamples
        ? words`, the smallest that ${counted(resamples, 'draw')} can show`
        : [];
  const adjusted = many
    ? words`; ${sayPValue(pAdjusted, atSmallest && pAdjusted < 1)} adjusted for all tests`
    : [];
  const first = many ? words`In the most extreme of the ${whole(tests.length)} tests, ` : [];
  const words_ = many ? FINDINGS[id] : capital(FINDINGS[id]);
  return words`${first}${words_} ${often(p, atSmallest)} if ${if_} (${sayPValue(p, atSmallest)}${from}${adjusted}).`;
}
