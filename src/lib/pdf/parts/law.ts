import { distributionTable } from '$lib/charts/distribution-table';
import { fitTable } from '$lib/charts/fit-table';
import { isShown } from '$lib/charts/is-shown';
import { referencesTable } from '$lib/charts/references-table';
import { poissonIsApart } from '$lib/model/report/poisson-is-apart';
import { sayDistance } from '$lib/model/report/say-distance';
import { sayOmitted } from '$lib/model/report/say-omitted';
import type { Diagnosis } from '$lib/stats/types';
import type { Part } from '../blocks/blocks';
import { NOTES } from './notes';
import { levelsBlocks } from './levels';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** Counts against the best law: the distance, the law itself, other laws, and the counts as a table. */
export function lawPart(document: Diagnosis): Part {
  const { distribution, data, fit } = document;
  const counts = thinTable(distributionTable(document), (i) => isShown(distribution[i], data.shots));
  return {
    title: 'Counts against the best law',
    rows: [
      {
        blocks: [
          { kind: 'paragraph', text: `${sayDistance(document)} The chart stands with the answer.` },
          ...levelsBlocks(document),
          { kind: 'table', caption: 'How far the best law lies from the counts', table: fitTable(document) },
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
