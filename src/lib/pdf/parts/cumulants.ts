import { ceilingPicture } from '$lib/charts/ceiling-picture';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { ceilingTitle } from '$lib/charts/ceiling-title';
import { cumulantsPlace } from '$lib/charts/cumulants-place';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { cumulantsTitle } from '$lib/charts/cumulants-title';
import { regionPicture } from '$lib/charts/region-picture';
import { formatNumber } from '$lib/model/format-number';
import { sayCriticalTrials } from '$lib/model/report/say-critical-trials';
import type { Diagnosis } from '$lib/stats/types';
import type { Block, MarginNote, Part } from '../blocks/blocks';
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
          regionBlock(document),
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

/** The counts in the plane of cumulants, or why they have no place in it. */
function regionBlock(document: Diagnosis): Block {
  const place = cumulantsPlace(document);
  return 'reason' in place
    ? { kind: 'paragraph', text: place.reason }
    : {
        kind: 'figure',
        what: 'Chart of the cumulants that independent trials can reach',
        title: cumulantsTitle(place),
        draw: (size) => regionPicture(place, size)
      };
}
