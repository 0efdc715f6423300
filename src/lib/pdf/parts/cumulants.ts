import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { ceilingTitle } from '$lib/charts/ceiling-title';
import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { cumulantsTitle } from '$lib/charts/cumulants-title';
import { regionPicture } from '$lib/charts/region-picture';
import { regionTable } from '$lib/charts/region-table';
import { formatNumber, formatPercent } from '$lib/model/format-number';
import { sayCriticalTrials } from '$lib/model/report/say-critical-trials';
import type { Diagnosis } from '$lib/stats/types';
import type { Block, MarginNote, Part } from '../blocks/blocks';
import { noteBlock } from './note-block';
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
          ...regionBlocks(document),
          { kind: 'table', caption: 'Cumulants, with 95 % intervals', table: cumulantsTable(document) },
          {
            kind: 'table',
            caption: 'Variance and ceiling, with 95 % intervals',
            table: ceilingTable(document)
          },
          ...noteBlock(saySmallest(document))
        ],
        notes: [NOTES.overCeiling, ...pairs]
      }
    ]
  };
}

/** The counts in the plane of cumulants and its points as a table, or why they have no place in it. */
function regionBlocks(document: Diagnosis): Block[] {
  const place = cumulantsPlace(document);
  if ('reason' in place) return [{ kind: 'paragraph', text: place.reason }];
  const { columns, rows } = regionTable(place);
  return [
    {
      kind: 'figure',
      what: 'Chart of the cumulants that independent trials can reach',
      title: cumulantsTitle(place),
      draw: (size) => regionPicture(place, size)
    },
    {
      kind: 'table',
      caption: 'Points of the chart',
      // Its edge is a curve of N and the mean alone, the same for all counts with them.
      table: { columns, rows: rows.filter(([point]) => point !== 'region') }
    }
  ];
}

/** What these shots could have shown; '' where the document does not say. */
const saySmallest = ({ answer }: Diagnosis): string =>
  answer.smallestExcess === null
    ? ''
    : `So many shots show an excess of ${formatPercent(answer.smallestExcess, 3)} over the ceiling in four of five repeats, by the variance alone at a level of 5\u202f%.`;
