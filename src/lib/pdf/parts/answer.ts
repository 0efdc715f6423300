import { distributionPicture } from '$lib/charts/distribution-picture';
import { distributionTitle } from '$lib/charts/distribution-title';
import { howBig } from '$lib/model/report/how-big';
import type { Part } from '../blocks/blocks';
import type { ReportInput } from '../report-input';
import { causesNote } from './causes';
import { masthead } from './masthead';
import { NOTES } from './notes';

/** The first page: the answer in one sentence, how sure, how big, what else it could be, and the counts. */
export function answerPart({ document, provenance }: ReportInput): Part {
  return {
    title: 'The answer',
    rows: [
      {
        blocks: [masthead(provenance)]
      },
      {
        blocks: [
          { kind: 'verdict', document },
          {
            kind: 'terms',
            terms: [
              { term: 'How sure', words: document.answer.because },
              { term: 'How big', words: howBig(document) }
            ].filter(({ words }) => words.length > 0)
          },
          {
            kind: 'figure',
            what: 'Chart of counts against the best independent-trial law',
            title: distributionTitle(document),
            draw: (size) => distributionPicture(document, size),
            fit: true
          }
        ],
        notes: [causesNote(document), NOTES.answers, NOTES.ceiling, NOTES.halfIntervals]
      }
    ]
  };
}
