import { sayMisreads, sayNeededRate } from '../report/say-misreads';
import { sayPairs, sayPostSelection, told, type Stated } from '../report/say-nuisances';
import { lumpWords } from '../lump-words';
import type { Summary } from './summary';

/** What can mimic interaction, as pairs of what and what is known of it, where the counts are kept back. */
export const summaryNuisances = (summary: Summary, stated: Stated | null): [string, string][] =>
  told([
    ['Misread sites', sayMisreads(summary)],
    ['Misread rate needed', sayNeededRate(summary)],
    [
      'Drift',
      summary.data.ordered
        ? 'The order of the shots is known; the tests above say what it shows.'
        : 'The order of the shots is not known: a probability that drifts between shots widens the counts, and cannot be told from bunching here.'
    ],
    ['Pairs', sayPairs(summary)],
    ['Post-selection', sayPostSelection(stated)],
    [
      'Lumped counts',
      summary.data.lumped || summary.data.opening
        ? `${lumpWords({ above: summary.data.lumped, below: summary.data.opening ?? false }).rows}; the likelihood of such a row is the sum of the law over them.`
        : 'No row lumps counts.'
    ]
  ]);
