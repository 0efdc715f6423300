import { answersPicture } from '$lib/charts/answers-picture';
import { answersTitle } from '$lib/charts/answers-title';
import { dispersed, sweepDispersionPicture } from '$lib/charts/sweep-dispersion-picture';
import { sweepDispersionTable } from '$lib/charts/sweep-dispersion-table';
import { sweepDispersionTitle } from '$lib/charts/sweep-dispersion-title';
import { columnsOf } from '$lib/charts/columns-of';
import type { SweepReport } from '$lib/stats/sweep/types';
import type { Block, Part } from '../blocks/blocks';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** What each dataset's own diagnosis said, along the axis. */
export function sweepAnswersPart(document: SweepReport): Part {
  const table = sweepDispersionTable(document);
  const titles = table.columns.map(({ title }) => title).filter((title) => title !== 'answer');
  const thin = thinTable(columnsOf(table, titles), () => true);
  const known: Block[] =
    dispersed(document).length === 0
      ? []
      : [
          {
            kind: 'figure',
            what: 'Chart of variance over ceiling along the axis',
            title: sweepDispersionTitle(document),
            draw: (size) => sweepDispersionPicture(document, size)
          },
          { kind: 'table', caption: 'Variance over ceiling of each dataset', table: thin.table },
          ...noteBlock(thin.note)
        ];
  return {
    title: 'Answers along the axis',
    rows: [
      {
        blocks: [
          {
            kind: 'figure',
            what: 'Chart of the answers along the axis',
            title: answersTitle(document),
            draw: (size) => answersPicture(document, size)
          },
          ...known
        ],
        notes: [
          {
            title: 'Whose answers these are',
            paragraphs: [
              'What the newest diagnosis of each dataset said when the sweep was made, with its own settings. The sweep changes none of them.'
            ]
          }
        ]
      }
    ]
  };
}
