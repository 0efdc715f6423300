import { distributionTable } from '$lib/charts/distribution-table';
import { isShown } from '$lib/charts/is-shown';
import { levelsTable } from '$lib/charts/levels-table';
import { referencesTable } from '$lib/charts/references-table';
import { poissonIsApart } from '$lib/model/report/poisson-is-apart';
import { sayDistance } from '$lib/model/report/say-distance';
import { sayOmitted } from '$lib/model/report/say-omitted';
import type { Diagnosis } from '$lib/stats/types';
import type { Block, Part } from '../blocks/blocks';
import { NOTES } from './notes';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** Counts against the best law: the distance, the law itself, other laws, and the counts as a table. */
export function lawPart(document: Diagnosis): Part {
  const { distribution, data, fit } = document;
  const levels = thinTable(levelsTable(document), () => true);
  const counts = thinTable(distributionTable(document), (i) => isShown(distribution[i], data.shots));
  const law: Block[] =
    levels.table.rows.length > 0
      ? [
          {
            kind: 'table',
            caption: 'The best law, by its distinct probabilities',
            table: levels.table
          },
          ...noteBlock(levels.note)
        ]
      : [];
  return {
    title: 'Counts against the best law',
    rows: [
      {
        blocks: [
          { kind: 'paragraph', text: `${sayDistance(document)} The chart stands with the answer.` },
          ...law,
          {
            kind: 'table',
            caption: 'Other laws, judged by the same likelihood',
            table: referencesTable(document)
          },
          ...noteBlock(sayOmitted(document))
        ],
        notes: [
          NOTES.bestLaw,
          NOTES.nats,
          ...(poissonIsApart(document) ? [NOTES.poisson] : []),
          { title: 'How the fit was reached', paragraphs: [fit.how] }
        ]
      },
      {
        blocks: [
          {
            kind: 'table',
            caption: 'Counts, with the exact 95 % interval of each share',
            table: counts.table
          },
          ...noteBlock(counts.note)
        ]
      }
    ]
  };
}
