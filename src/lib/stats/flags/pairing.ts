import type { Flag } from '../types';
import { formatPercent } from '../words/format-number';
import { allEven, gradeOf, type Evidence } from './evidence';

/** Pairing: one parity of the count is preferred, and not through a single count. */
export function pairing(evidence: Evidence): Flag | null {
  const grade = gradeOf(evidence, 'parity');
  if (!grade || !evidence.even || evidence.even.oneCountAlone) return null;
  const share = evidence.even.seen / evidence.shots;
  const every = allEven(evidence);
  return {
    id: 'pairing',
    grade,
    tests: ['parity'],
    statement: every
      ? 'Every count is even: defects were made, or counted, in pairs.'
      : `Counts prefer to be ${share > evidence.even.expected ? 'even' : 'odd'}: defects come and go in pairs more often than chance allows.`,
    size: `${formatPercent(share, 3)} of the shots have an even count; the best independent law expects ${formatPercent(evidence.even.expected, 3)}.`,
    otherCauses: [
      'ring geometry, where kinks are even by construction: count pairs instead',
      'boundary sites that favour one phase',
      ...(gradeOf(evidence, 'empty-shots') && share > evidence.even.expected
        ? ['dead shots: each of them counts as even']
        : []),
      ...(every
        ? ['the same counts entered doubled']
        : ['misread sites on a ring, when most counts are even and a few odd'])
    ],
    next: [
      every
        ? 'Repeat the check with pairs as the unit: n/2 out of N/2.'
        : 'On a ring, estimate the misread rate from the odd counts, then count pairs.',
      'On an open chain, free the boundary sites and compare.'
    ]
  };
}
