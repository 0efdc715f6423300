import { distributionPicture } from '$lib/charts/distribution-picture';
import { distributionTitle } from '$lib/charts/distribution-title';
import { howBig } from '$lib/model/report/how-big';
import { whatElse } from '$lib/model/report/what-else';
import type { MarginNote, Part } from '../blocks/blocks';
import type { ReportInput } from '../report-input';
import { cleanText } from '../type/clean-text';
import { NOTES } from './notes';
import { sayWhen } from './say-when';

/** The first page: the answer in one sentence, how sure, how big, what else it could be, and the counts. */
export function answerPart({ document, provenance }: ReportInput): Part {
  const causes: MarginNote = {
    title: 'What else it could be',
    paragraphs: whatElse(document).map(({ flag, words }) => (flag === null ? words : `${flag} ${words}`))
  };
  const { team, madeAt } = provenance;
  const line = [team === null ? '' : cleanText(team), madeAt === null ? '' : sayWhen(madeAt)]
    .filter((part) => part !== '')
    .join(', ');
  return {
    title: 'The answer',
    rows: [
      {
        blocks: [{ kind: 'masthead', name: provenance.dataset, line: line || 'Report on counts of defects' }]
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
        notes: [causes, NOTES.answers, NOTES.ceiling, NOTES.halfIntervals]
      }
    ]
  };
}
