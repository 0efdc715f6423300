import { ratePicture } from '$lib/charts/rate-picture';
import { rateTable } from '$lib/charts/rate-table';
import { formatNumber } from '$lib/model/format-number';
import { rateTitle } from '$lib/charts/rate-title';
import type { Diagnosis } from '$lib/stats/types';
import type { Part } from '../blocks/blocks';
import { NOTES } from './notes';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** The rate function, as a chart and a table. */
export function ratePart(document: Diagnosis): Part {
  const { points, horizon, silence, scale } = document.rate;
  const unit = scale === 1 ? 'nats a shot' : 'nats a trial';
  const rates = thinTable(rateTable(document), (i) => {
    const { empirical, fitted } = points[i];
    return empirical !== null || (fitted !== null && fitted <= 1.3 * horizon);
  });
  return {
    title: 'Rate function',
    rows: [
      {
        blocks: [
          {
            kind: 'figure',
            what: 'Chart of the rate function',
            title: rateTitle(document),
            draw: (size) => ratePicture(document, size)
          }
        ],
        notes: [NOTES.rate, NOTES.horizon, NOTES.whichLine]
      },
      {
        blocks: [
          { kind: 'table', caption: 'Rates, with their 95 % intervals', table: rates.table },
          ...noteBlock(rates.note),
          ...noteBlock(
            `The shot horizon lies at ${formatNumber(horizon)} ${unit}; above ${formatNumber(silence)} these shots say nothing at 95\u202f%.`
          )
        ]
      }
    ]
  };
}
