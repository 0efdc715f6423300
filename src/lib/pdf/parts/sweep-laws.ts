import { lawsTable } from '$lib/charts/laws-table';
import { windowsPicture } from '$lib/charts/windows-picture';
import { windowsTable } from '$lib/charts/windows-table';
import { windowsTitle } from '$lib/charts/sweep-titles';
import { formatNumber } from '$lib/model/format-number';
import type { SweepReport } from '$lib/stats/sweep/types';
import type { Block, Part } from '../blocks/blocks';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** Power laws in the window, the test of one exponent, and how the exponent moves with the window. */
export function sweepLawsPart(document: SweepReport): Part {
  const { laws, windows, window, timeUnit, alpha } = document;
  const unit = timeUnit ? `\u00a0${timeUnit}` : '';
  const held = `Window from ${formatNumber(window.from)} to ${formatNumber(window.to)}${unit}, both included; level ${alpha}.`;
  const fitted: Block[] = laws
    ? [{ kind: 'table', caption: 'Exponents of the power laws', table: lawsTable(document) }]
    : [];
  const thin = thinTable(windowsTable(document), () => true);
  const moved: Block[] =
    windows.length === 0
      ? []
      : [
          {
            kind: 'figure',
            what: 'Chart of the common exponent window by window',
            title: windowsTitle(document),
            draw: (size) => windowsPicture(document, size)
          },
          { kind: 'table', caption: 'The common exponent window by window', table: thin.table },
          ...noteBlock(thin.note)
        ];
  return {
    title: 'Power laws',
    rows: [
      {
        blocks: [{ kind: 'paragraph', text: held }, ...fitted, ...moved],
        notes: [
          {
            title: 'One exponent',
            paragraphs: [
              'The three exponents are tied, and χ² grows by the number in the last line. Beside the first cumulant stand χ² and p of power laws at all.'
            ]
          },
          {
            title: 'Other windows',
            paragraphs: [
              'The window shrunk from either end: an exponent that moves belongs to no one power law.'
            ]
          }
        ]
      }
    ]
  };
}
