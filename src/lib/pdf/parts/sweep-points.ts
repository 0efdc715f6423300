import { columnsOf } from '$lib/charts/columns-of';
import { sweepTable } from '$lib/charts/sweep-table';
import type { Table } from '$lib/charts/table';
import type { Block, Part } from '../blocks/blocks';
import type { SweepPdfInput, SweepSource } from '../sweep-input';
import { noteBlock } from './note-block';
import { thinTable } from './thin-table';

/** Every dataset with its numbers, and where each comes from. */
export function sweepPointsPart({ document, sources }: SweepPdfInput): Part {
  const whole = sweepTable(document);
  const [, time] = whole.columns.map(({ title }) => title);
  const triple = (name: string) => [name, `${name}, low`, `${name}, high`];
  const cut = (caption: string, titles: string[]): Block[] => {
    const { table, note } = thinTable(columnsOf(whole, titles), () => true);
    return [{ kind: 'table', caption, table }, ...noteBlock(note)];
  };
  return {
    title: 'The datasets',
    rows: [
      { blocks: cut('Along the axis', ['dataset', time, 'shots', 'in the window', 'answer']) },
      { blocks: cut('Mean and variance', [time, ...triple('κ₁'), ...triple('κ₂')]) },
      { blocks: cut('Third cumulant', [time, ...triple('κ₃')]) },
      { blocks: cut('Ratios', [time, ...triple('κ₂/κ₁'), ...triple('κ₃/κ₁')]) },
      ...(sources
        ? [
            {
              blocks: [
                {
                  kind: 'table' as const,
                  caption: 'Where each dataset comes from',
                  table: sourceTable(sources)
                }
              ]
            }
          ]
        : [])
    ]
  };
}

const sourceTable = (sources: SweepSource[]): Table => ({
  columns: ['dataset', 'device', 'firmware', 'group', 'digest, first 12 signs'].map((title) => ({
    title,
    kind: 'text' as const
  })),
  rows: sources.map(({ name, device, firmware, group, digest }) => [
    name,
    device ?? '–',
    firmware ?? '–',
    group ?? '–',
    digest.replace(/^sha256:/, '').slice(0, 12)
  ])
});
