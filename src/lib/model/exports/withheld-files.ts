import { VERDICTS } from '../labels';
import type { Summary } from '../link/summary';
import { summaryText } from '../link/summary-text';
import { wrap } from '../plain-text/wrap';
import { bundleFile } from './bundle-file';
import type { Bundle } from './bundle-files';
import { listFiles } from './list-files';
import { onOneLine } from './on-one-line';
import { withSums } from './with-sums';

/** What a link that keeps the counts back gives as a bundle: the page's own numbers, and why there is no more. */
export function withheldFiles(summary: Summary, about: string[]): Bundle {
  const told = 'what the link shows of the report, as numbers and sentences';
  const file = bundleFile('summary.json', told, summaryText(summary));
  const readme = [
    'A report on counts of defects, made by Severalty, without its counts',
    ...about.map((text) => wrap(onOneLine(text))),
    wrap(`${VERDICTS[summary.answer.verdict]}. ${summary.answer.statement}`),
    summary.answer.because.map((text) => wrap(text, '- ')).join('\n'),
    'What is here',
    listFiles([file]),
    wrap(
      'This link keeps the counts back. So there are no counts here, no shares of shots, no tables and charts drawn from them, and no document to compute again: ask the team for a link that shows the counts. Numbers are rounded, intervals outward. That does not make the counts secret: who guesses them can check the guess against what is left.'
    ),
    'What to keep in mind',
    summary.cautions.map((text) => wrap(text, '- ')).join('\n')
  ];
  return {
    folder: `severalty-${file.sha256.slice(0, 12)}`,
    files: withSums(`${readme.join('\n\n')}\n`, [file])
  };
}
