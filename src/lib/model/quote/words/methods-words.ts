import type { Provenance } from '../provenance';
import type { Quotable } from '../quotable';
import { joined, type Words } from '../span';
import { sayCertificate } from './say-certificate';
import { sayDistance, sayScatter } from './say-comparison';
import { sayFit, sayFloor } from './say-fit';
import { sayGiven } from './say-given';
import { sayRule } from './say-rule';
import { sayTestsRun } from './say-tests-run';

/** The methods paragraph: what was given, what was fitted, how it was compared, and by what rule it was answered. */
export function methodsWords(quotable: Quotable, provenance: Provenance): Words {
  return joined(
    [
      ...sayGiven(quotable, provenance),
      ...sayFit(quotable),
      ...sayDistance(quotable),
      ...sayFloor(quotable),
      ...sayScatter(quotable),
      ...sayTestsRun(quotable),
      ...sayCertificate(quotable),
      ...sayRule(quotable)
    ],
    ' '
  );
}
