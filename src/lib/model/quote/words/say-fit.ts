import { roundToDigits } from '../numbers/round-to-digits';
import type { Quotable } from '../quotable';
import { SOURCES_BY_YEAR } from '../sources';
import { math, number, text, words, type Words } from '../span';
import { sayMisread } from './say-misread';
import { testedTrials } from './units';

/** Which law was fitted. */
export function sayFit(quotable: Quotable): Words[] {
  if (quotable.data.misreadApplied)
    return [
      words`The law of independent kinks ${quotable.data.geometry === 'ring-bonds' ? 'round a ring' : 'along an open chain'} of ${math('N')} bonds${quotable.data.geometry === 'ring-bonds' ? ', given that their number is even' : ''}${sayMisread(quotable)}, was fitted by maximum likelihood; up to three kink probabilities were searched, and not every order of the bonds, so a nearer law may exist.`
    ];
  if (testedTrials(quotable) === null)
    return [
      [
        text(
          'The law of a sum of independent trials of any number, each with a probability of its own (Poisson–binomial, with a Poisson part for many rare trials), was fitted by maximum likelihood.'
        )
      ]
    ];
  const trials = math(quotable.data.unit === 'pair' ? 'N/2' : 'N');
  return [
    words`The law of a sum of ${trials} independent trials, each with a probability of its own (Poisson–binomial), was fitted by maximum likelihood.`
  ];
}

/** Whether another law of independent trials could fit better, from the floor under all of them. */
export function sayFloor({ fit: { certified, found, floor } }: Quotable): Words[] {
  if (certified === null || found === null || floor === null) return [];
  const obey = `that obey Newton’s inequalities, as those of independent trials do (${SOURCES_BY_YEAR.pitman})`;
  if (certified)
    return [words`Its likelihood is the largest of all laws ${obey}, so no independent trials fit better.`];
  if (floor === 0) return [];
  return [
    words`The law found lies at ${number(roundToDigits(found, 3))} nats a shot and the nearest of all laws ${obey}, at ${number(roundToDigits(floor, 3))}: no independent trials come closer than that.`
  ];
}
