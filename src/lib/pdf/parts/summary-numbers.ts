import { levelsTable } from '$lib/charts/levels-table';
import { summaryCumulantsTable, summaryTestsTable } from '$lib/charts/summary-tables';
import { sayNotRun, saySummaryDistance, sayWithheldLaw } from '$lib/model/link/say-summary';
import type { Summary } from '$lib/model/link/summary';
import type { Block, Part } from '../blocks/blocks';
import { noteBlock } from './note-block';
import { NOTES } from './notes';

/** The best law as far as it is shown without its counts. */
export function summaryLawPart(summary: Summary): Part {
  const distance = saySummaryDistance(summary);
  const law: Block[] =
    summary.fit.law === null
      ? [{ kind: 'paragraph', text: sayWithheldLaw }]
      : [
          {
            kind: 'table',
            caption: 'The best law, by its distinct probabilities',
            table: levelsTable({ fit: summary.fit.law })
          }
        ];
  const said: Block[] = distance === '' ? [] : [{ kind: 'paragraph', text: distance }];
  return { title: 'The best law', rows: [{ blocks: [...said, ...law], notes: [NOTES.bestLaw] }] };
}

export const summaryCumulantsPart = (summary: Summary): Part => ({
  title: 'Cumulants and the ceiling',
  rows: [
    {
      blocks: [
        {
          kind: 'table',
          caption: 'Cumulants, with 95 % intervals',
          table: summaryCumulantsTable(summary)
        },
        ...noteBlock(summary.moments.third ? '' : 'κ₃ and κ₄ are kept back with the counts.')
      ],
      notes: [NOTES.overCeiling]
    }
  ]
});

export const summaryTestsPart = (summary: Summary): Part => ({
  title: 'Tests',
  rows: [
    {
      blocks: [
        {
          kind: 'table',
          caption: 'If defects formed independently, a result as extreme as in each test',
          table: summaryTestsTable(summary),
          digits: 2
        },
        ...noteBlock(sayNotRun(summary))
      ],
      notes: [NOTES.severalTests]
    }
  ]
});
