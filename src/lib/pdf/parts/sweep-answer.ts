import { sweepPicture } from '$lib/charts/sweep-picture';
import { sweepTitle } from '$lib/charts/sweep-titles';
import type { Part } from '../blocks/blocks';
import type { SweepPdfInput } from '../sweep-input';
import { cleanText } from '../type/clean-text';
import { sayWhen } from './say-when';

/** The first page: the answer in one sentence, what it rests on, what it cannot tell, and the chart of the cumulants. */
export function sweepAnswerPart({ document, name, team, madeAt }: SweepPdfInput): Part {
  const line = [team === null ? '' : cleanText(team), madeAt === null ? '' : sayWhen(madeAt)]
    .filter((part) => part !== '')
    .join(', ');
  const axis = document.axis === 'quench-time' ? 'quench time' : 'hold time';
  return {
    title: 'The answer',
    rows: [
      { blocks: [{ kind: 'masthead', name, line: line || `Sweep over ${axis}` }] },
      {
        blocks: [
          { kind: 'statement', text: document.statement },
          { kind: 'terms', terms: [{ term: 'What it rests on', words: document.because }] },
          {
            kind: 'figure',
            what: `Chart of the cumulants over ${axis}, both logarithmic`,
            title: sweepTitle(document),
            draw: (size) => sweepPicture(document, size),
            fit: true
          }
        ],
        notes: [{ title: 'What this cannot tell', items: document.cautions }]
      }
    ]
  };
}
