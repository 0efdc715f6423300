import { GEOMETRIES, UNITS } from '$lib/model/labels';
import type { DiagnoseOptions } from '$lib/stats/types';
import { writeKept } from '../read-kept';
import { compareLines } from './compare-lines';
import type { ComparedPart } from './compared';

/** What was asked for: the experiment as stated, and how hard to look. */
export function compareOptions(first: DiagnoseOptions, second: DiagnoseOptions): ComparedPart {
  const both = <Value>(say: (options: DiagnoseOptions) => Value) => [say(first), say(second)] as const;
  return compareLines('options', 'Options', [
    ['Trials in a shot, N', ...both(({ trials }) => trials ?? 'unknown')],
    ['Unit', ...both(({ unit }) => UNITS[unit])],
    ['Counted on', ...both(({ geometry }) => GEOMETRIES[geometry])],
    ['Chance to misread a site', ...both(({ misread }) => misread ?? 'not stated')],
    ['Uncertainty of that chance', ...both(({ misreadUncertainty }) => misreadUncertainty ?? 'not stated')],
    ['Counts kept', ...both(({ kept }) => (kept ? writeKept(kept) : 'all'))],
    ['Level of the answer', ...both(({ alpha }) => alpha)],
    ['Excess that matters', ...both(({ tolerance }) => tolerance)],
    ['Resampled histograms at most', ...both(({ resamples }) => resamples)],
    ['Seed', ...both(({ seed }) => seed)],
    [
      'Law to compare with',
      // Two laws of one length are still told apart by their probabilities.
      ...both(({ supplied }) => (supplied ? `${supplied.length} trials: ${supplied.join(', ')}` : 'none'))
    ]
  ]);
}
