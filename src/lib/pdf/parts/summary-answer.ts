import type { Summary } from '$lib/model/link/summary';
import { flagSizes } from '$lib/model/report/how-big';
import type { Part } from '../blocks/blocks';
import type { Provenance } from '../report-input';
import { causesNote } from './causes';
import { masthead } from './masthead';
import { NOTES } from './notes';

/** The first page of a report without its counts. */
export function summaryAnswerPart(summary: Summary, provenance: Provenance): Part {
  return {
    title: 'The answer',
    rows: [
      { blocks: [masthead(provenance)] },
      {
        blocks: [
          { kind: 'verdict', document: summary },
          {
            kind: 'terms',
            terms: [
              { term: 'How sure', words: summary.answer.because },
              { term: 'How big', words: flagSizes(summary) }
            ].filter(({ words }) => words.length > 0)
          }
        ],
        notes: [causesNote(summary), NOTES.withoutCounts, NOTES.answers, NOTES.ceiling]
      }
    ]
  };
}
