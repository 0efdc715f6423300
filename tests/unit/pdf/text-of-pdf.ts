import { execFileSync } from 'node:child_process';
import { plainSpaces, readPdf } from './read-pdf';

const hasPdftotext = (): boolean => {
  try {
    execFileSync('pdftotext', ['-v'], { stdio: 'ignore' });
    return true;
  } catch {
    return false;
  }
};

/**
 * What reads PDFs here: pdftotext (Debian's poppler-utils), as readers of a report have it; where it is not installed
 * the reader written for these tests, which reads the same bytes. Which of them it was stands in the names of the tests.
 */
export const READER = hasPdftotext() ? 'pdftotext' : 'the reader of the tests, since pdftotext is not here';

/**
 * All text of a PDF as one line: no blank twice, and none between a sign such as ≥ and its number.
 *
 * @param order line by line across the page, so that the cells of a row stand together; or column by column, so that
 *   sentences do
 */
export function textOfPdf(bytes: Uint8Array, order: 'lines' | 'columns'): string {
  const layout = order === 'lines' ? ['-layout'] : [];
  const text =
    READER === 'pdftotext'
      ? execFileSync('pdftotext', [...layout, '-enc', 'UTF-8', '-', '-'], { input: bytes, encoding: 'utf8' })
      : readPdf(bytes).text;
  return plainSpaces(text).replace(/([≤≥]) /g, '$1');
}
