import { saveFile } from './save-file';
import type { Sheet } from './sheet-of';
import { sheetToCanvas } from './sheet-to-canvas';
import { sheetToSvg } from './sheet-to-svg';

export function saveSvg(name: string, sheet: Sheet, title: string): void {
  saveFile(`${name}.svg`, sheetToSvg(sheet, title), 'image/svg+xml');
}

/** Two dots a unit, enough for a column of print. The page's own fonts are used, so they must have loaded. */
export async function savePng(name: string, sheet: Sheet): Promise<void> {
  await document.fonts.ready;
  const canvas = document.createElement('canvas');
  canvas.width = Math.ceil(sheet.width * 2);
  canvas.height = Math.ceil(sheet.height * 2);
  const context = canvas.getContext('2d');
  if (!context) throw new Error('This browser gives no canvas to draw on.');
  context.scale(2, 2);
  sheetToCanvas(sheet, context);
  const blob = await new Promise<Blob | null>((done) => canvas.toBlob(done, 'image/png'));
  if (!blob) throw new Error('This browser could not make the PNG file.');
  saveFile(`${name}.png`, blob);
}
