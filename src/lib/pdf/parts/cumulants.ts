import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { ceilingTitle } from '$lib/charts/ceiling-title';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { formatNumber } from '$lib/model/format-number';
import { sayCriticalTrials } from '$lib/model/report/say-critical-trials';
import type { Diagnosis } from '$lib/stats/types';
import type { MarginNote, Part } from '../blocks/blocks';
import { NOTES } from './notes';

/** Cumulants, and the variance against the ceiling that independent trials cannot cross. */
export function cumulantsPart(document: Diagnosis): Part {
  const { pairCovariance } = document.moments;
  const pairs: MarginNote[] =
    pairCovariance === null
      ? []
      : [
          {
            title: 'Covariance of pairs',
            paragraphs: [
              `Summed over all pairs of trials, their covariance is at least ${formatNumber(pairCovariance, 3)}: variance minus ceiling.`
            ]
          }
        ];
  return {
    title: 'Cumulants and the ceiling',
    rows: [
      {
        blocks: [
          {
            kind: 'figure',
            what: 'Chart of the variance over its ceiling',
            title: ceilingTitle(document),
            draw: (size) => ceilingPicture(document, size)
          },
          { kind: 'paragraph', text: sayCriticalTrials(document) },
          { kind: 'table', caption: 'Cumulants, with 95 % intervals', table: cumulantsTable(document) },
          {
            kind: 'table',
            caption: 'Variance and ceiling, with 95 % intervals',
            table: ceilingTable(document)
          }
        ],
        notes: [NOTES.overCeiling, ...pairs]
      }
    ]
  };
}
