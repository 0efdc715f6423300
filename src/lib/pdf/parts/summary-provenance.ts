import type { Summary } from '$lib/model/link/summary';
import type { Part } from '../blocks/blocks';
import type { Provenance } from '../report-input';
import { whoFacts } from './who';

/** Which engine at which level, and who made it unless the report is blind. Digests and seed would tell the counts. */
export const summaryProvenancePart = ({ engine }: Summary, provenance: Provenance): Part => ({
  title: 'Where this result comes from',
  rows: [
    {
      blocks: [
        {
          kind: 'facts',
          facts: [
            ['Engine', `Severalty ${engine.version}`],
            ['Level of the answer', String(engine.alpha)],
            ['Excess that matters', String(engine.tolerance)],
            ...whoFacts(provenance)
          ]
        }
      ]
    }
  ]
});
