import type { Quotable } from '../quotable';
import { words, type Words } from '../span';
import { givenPercent } from './say-number';

/** ", read with 1 % of the sites misread" where the tests allow for it; nothing elsewhere. */
export function sayMisread({ data }: Pick<Quotable, 'data'>): Words {
  return data.misreadApplied && data.misread
    ? words`, read with ${givenPercent(data.misread)} of the sites misread`
    : [];
}
