import type { Quotable } from '../quotable';
import { joined, type Words } from '../span';
import { sayAnswer } from './say-answer';
import { sayBeyond } from './say-beyond';
import { sayEvidence } from './say-evidence';
import { sayExplained } from './say-explained';
import { sayMoments } from './say-moments';

/** The result to quote: the answer, mean and variance, the distance, how surprising it is, which story leads, what it does not show. */
export function resultWords(quotable: Quotable): Words {
  return joined(
    [
      sayAnswer(quotable),
      ...sayMoments(quotable),
      ...sayEvidence(quotable),
      ...sayExplained(quotable),
      ...sayBeyond(quotable)
    ],
    ' '
  );
}
