import { certificateWords } from '$lib/charts/certificate-words';
import { tailsPicture } from '$lib/charts/tails-picture';
import { tailsTable } from '$lib/charts/tails-table';
import { tailsTitle } from '$lib/charts/tails-title';
import { formatNumber } from '$lib/model/format-number';
import type { Diagnosis } from '$lib/stats/types';
import type { Block, Part } from '../blocks/blocks';
import { NOTES } from './notes';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** Both tails with the bounds on them, and the certificate. */
export function tailsPart(document: Diagnosis): Part {
  const { points } = document.tails;
  const shots = document.data.shots;
  const tails = thinTable(
    tailsTable(document),
    (i) => points[i].shots > 0 || points[i].fitted * shots > 0.02
  );
  const { certificate } = document.tails;
  const said: Block[] =
    certificate === null
      ? []
      : [
          { kind: 'paragraph', text: certificateWords(document) },
          ...noteBlock(`The bound of that tail as a share of the shots: ${formatNumber(certificate.bound)}.`)
        ];
  return {
    title: 'Both tails',
    rows: [
      {
        blocks: [
          {
            kind: 'figure',
            what: 'Chart of both tails on a logarithmic scale',
            title: tailsTitle(document),
            draw: (size) => tailsPicture(document, size)
          },
          ...said
        ],
        notes: [NOTES.edge, NOTES.chernoff]
      },
      {
        blocks: [
          { kind: 'table', caption: 'Tails and the bounds on them', table: tails.table },
          ...noteBlock(tails.note)
        ]
      }
    ]
  };
}
