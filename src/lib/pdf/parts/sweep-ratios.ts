import { ratioPicture } from '$lib/charts/ratio-picture';
import { ratioTitle } from '$lib/charts/ratio-title';
import { steadyTable } from '$lib/charts/steady-table';
import { RATIO_NAMES } from '$lib/model/team/sweeps/ratio-names';
import type { SweepReport } from '$lib/stats/sweep/types';
import type { Part } from '../blocks/blocks';

/** Ratios of cumulants beside those of known laws, in the table and one chart each; nothing where none is known. */
export function sweepRatiosParts(document: SweepReport): Part[] {
  const { steady } = document;
  if (steady.length === 0) return [];
  return [
    {
      title: 'Ratios beside known laws',
      rows: [
        { blocks: [{ kind: 'table', caption: 'Ratios over the window', table: steadyTable(document) }] },
        {
          blocks: steady.map((one) => ({
            kind: 'figure',
            what: `Chart of ${RATIO_NAMES[one.id]} along the axis`,
            title: ratioTitle(one, document),
            draw: (size) => ratioPicture(document, one, size)
          })),
          notes: [
            {
              title: 'Where the known values come from',
              paragraphs: [
                'Landau–Zener pairs: 1 − 1/√2 and 1 − 3/√2 + 2/√3, by the integrals of p, p² and p³ over p = exp(−a k²); as kinks twice and four times that. Coarsening of a chain from zero temperature: simulated, 0.584 ± 0.004 and 0.146 ± 0.044.'
              ]
            }
          ]
        }
      ]
    }
  ];
}
