import { VERDICTS } from '../labels';
import type { Summary } from '../link/summary';
import { wrap } from '../plain-text/wrap';
import type { BundleFile } from './bundle-input';
import type { Bundle } from './bundle-files';
import { fileSha256 } from './file-sha256';
import { listFiles } from './list-files';
import { withSums } from './with-sums';

/** What a link that keeps the counts back gives as a bundle: the page's own numbers, and why there is no more. */
export function withheldFiles(summary: Summary, about: string[]): Bundle {
  const bytes = new TextEncoder().encode(summaryText(summary));
  const contents: BundleFile[] = [
    { path: 'summary.json', what: 'what the link shows of the report, as numbers and sentences', bytes }
  ];
  const readme = [
    'A report on counts of defects, made by Severalty, without its counts',
    ...about.map((text) => wrap(text)),
    wrap(`${VERDICTS[summary.answer.verdict]}. ${summary.answer.statement}`),
    summary.answer.because.map((text) => wrap(text, '- ')).join('\n'),
    'What is here',
    listFiles(contents),
    wrap(
      'This link keeps the counts back. So there are no counts here, no shares of shots, no tables and charts drawn from them, and no document to compute again: ask the team for a link that shows the counts. Numbers are rounded, intervals outward. That does not make the counts secret: who guesses them can check the guess against what is left.'
    ),
    'What to keep in mind',
    summary.cautions.map((text) => wrap(text, '- ')).join('\n')
  ];
  return {
    folder: `severalty-${fileSha256(bytes).slice(0, 12)}`,
    files: withSums(`${readme.join('\n\n')}\n`, contents)
  };
}

/** The text of a summary as a file, the same wherever it is given out. */
export const summaryText = (summary: Summary): string => `${JSON.stringify(summary, null, 2)}\n`;
