import type { Flag } from '../types';
import { formatPercent } from '../words/format-number';
import { sayRate } from '../words/say-rate';
import { ringNeeded } from '../misread/ring-needed';
import { gradeOf, oddOnRing, type Evidence } from './evidence';
import { misreadNeeded } from './misread-needed';

/**
 * Misreads: kinks are read from neighbouring sites, the ceiling is broken, and a misread rate under 10 % would
 * make independent kinks look so. Only ever a hint: the counts alone cannot tell flips from bunching.
 */
export function misreads(evidence: Evidence): Flag | null {
  const { geometry, misread } = evidence.options;
  const { mean, variance } = evidence.moments;
  if (geometry === 'sites' || oddOnRing(evidence) > 0 || !gradeOf(evidence, 'ceiling') || !evidence.trials)
    return null;
  const ring = geometry === 'ring-bonds';
  if (evidence.options.unit === 'pair' || (ring && evidence.trials < 3)) return null;
  const needed = (ring ? ringNeeded : misreadNeeded)(mean.value!, variance.value!, evidence.trials);
  if (!needed || needed > 0.1) return null;
  // A stated rate that falls well short of what is needed speaks against this explanation.
  if (misread !== null && misread < 0.8 * needed) return null;
  const stated = misread ? ` You stated ${sayRate(misread)}.` : '';
  return {
    id: 'misreads',
    grade: 'hinted',
    tests: ['ceiling'],
    statement:
      (evidence.misread?.applies ? 'More misread sites than stated' : 'Misread sites alone') +
      ' could give this excess: each toggles two neighbouring bonds, so independent kinks look bunched.',
    size: `Independent kinks with a misread rate of ${formatPercent(needed)} a site would have this mean and variance.${stated}`,
    otherCauses: ['true bunching; the counts alone cannot tell the two apart'],
    next: ['Measure the misread rate of a site on prepared states and compare it with the rate above.']
  };
}
