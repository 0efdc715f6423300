import { asGiven } from '../numbers/as-given';
import type { Quotable } from '../quotable';
import { emphasis, equation, math, words, type Words } from '../span';
import { given } from './say-number';

/** The rule of the three answers, with the settings it was used with. */
export function sayRule({ engine, certificate }: Quotable): Words[] {
  const adjusted = words`an adjusted ${math('p')}`;
  const any = certificate ? words`the ${math('p')} of the certificate or ${adjusted}` : adjusted;
  return [
    words`Independent trials are called ${emphasis('ruled out')} when ${any} is at most ${equation('α', '=', asGiven(engine.alpha))}; the counts are called ${emphasis('compatible')} with them when that is not so, the upper 95\u202f% limit of variance over ceiling lies below 1 + ${given(engine.tolerance)}, at least 50 shots were taken and would have shown an excess of half the ceiling, and no test is as extreme as its draws can show; otherwise the answer is ${emphasis('undecided')}.`
  ];
}
