import type { Picture, Size } from './picture';
import { saveFile } from './save-file';
import { savePng, saveSvg } from './save-picture';
import { sheetOf } from './sheet-of';
import type { Table } from './table';
import { tableToCsv } from './table-to-csv';

/** A chart as it is saved, always drawn at the same size whatever the screen. */
interface SavedChart {
  name: string;
  title: string;
  source: string;
  draw: (size: Size) => Picture;
  table: Table;
}

/** Saves a chart, or the numbers of its table, as a file. */
export async function saveChart(kind: 'svg' | 'png' | 'csv', chart: SavedChart): Promise<void> {
  const { name, title, source, draw, table } = chart;
  if (kind === 'csv') return saveFile(`${name}.csv`, tableToCsv(table), 'text/csv');
  const sheet = sheetOf(draw({ width: 720, text: 13 }), title, source);
  return kind === 'png' ? savePng(name, sheet) : saveSvg(name, sheet, title);
}
