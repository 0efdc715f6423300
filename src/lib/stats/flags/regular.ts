import type { Flag } from '../types';
import { sayInterval } from '../words/say-interval';
import { allEven, pairsOnRing, type Evidence } from './evidence';

/** Where N is unknown the ceiling is that of rare events, which any number of trials stays under. */
const ofUnknown =
  'A remark, not a violation: counts vary less than rare events of this mean would. A limited number of trials gives that by itself, as do uneven probabilities and repulsion between defects; the counts alone cannot tell which.';

/**
 * Regular: the variance lies well below the ceiling. Not a violation: shown when the whole 95 % interval of
 * variance/ceiling is below 1 − 2·tolerance, hinted below 1 − tolerance.
 */
export function regular(evidence: Evidence): Flag | null {
  const { dispersion } = evidence.moments;
  const { tolerance } = evidence.options;
  // Counted singly, pairs are neither regular nor bunched: the unit is wrong.
  if (dispersion.high === null || !(dispersion.high < 1 - tolerance) || allEven(evidence)) return null;
  return {
    id: 'regular',
    grade: dispersion.high < 1 - 2 * tolerance ? 'shown' : 'hinted',
    tests: [],
    statement:
      evidence.trials === null
        ? ofUnknown
        : 'A remark, not a violation: counts are more regular than equal independent trials would make them. Uneven probabilities give that, and so does repulsion between defects; the counts alone cannot tell which.',
    size: `The variance is ${sayInterval(dispersion, 3)} times the ceiling of independent trials${evidence.misread?.applies ? ' as they are read' : ''}${evidence.options.kept ? ', cut as stated' : ''}.`,
    otherCauses: [
      ...(pairsOnRing(evidence)
        ? [
            'the ring itself: single kinks that form independently, but for their even total, vary about half as much'
          ]
        : []),
      ...(evidence.trials === null ? ['a number of trials not far above the counts: give it'] : []),
      'probabilities that differ between trials, such as modes of different momentum',
      'repulsion or exclusion between neighbouring defects',
      'post-selection: dropping empty shots or large counts makes counts look regular',
      'more trials claimed than can hold a defect'
    ],
    next: [
      'Say whether any shots were dropped, and by what rule.',
      'Measure correlations between sites: exclusion shows there even where the counts are compatible.'
    ]
  };
}
