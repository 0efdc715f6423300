import { VERDICTS } from '../labels';
import { wrap } from '../plain-text/wrap';
import type { BundleFile, BundleInput } from './bundle-input';
import { listFiles } from './list-files';
import { onOneLine } from './on-one-line';
import { recomputeCommand } from './recompute-command';

/**
 * README.txt of a bundle: what it is, the answer, every file with its sha256, how to compute the report again and how
 * to compare, and what to keep in mind.
 *
 * @param hasShots the shots in their order are in it
 */
export function bundleReadme(
  input: BundleInput,
  contents: BundleFile[],
  { folder, hasShots }: { folder: string; hasShots: boolean }
): string {
  const { document, about, pdf } = input;
  const paragraphs = (texts: string[]) => texts.map((text) => wrap(text)).join('\n\n');
  const bullets = (texts: string[]) => texts.map((text) => wrap(text, '- ')).join('\n');
  const missing = pdf
    ? []
    : ['The report for print is not in it. The command below makes it with --pdf report.pdf added.'];
  return `${[
    'A report on counts of defects, made by Severalty',
    paragraphs([
      ...about.map(onOneLine),
      'Severalty asks whether counts of defects can be a sum of independent trials, and answers with compatible, ruled out or undecided.'
    ]),
    titled('The answer'),
    paragraphs([`${VERDICTS[document.answer.verdict]}. ${document.answer.statement}`]),
    bullets(document.answer.because),
    titled('What is here'),
    listFiles(contents),
    paragraphs([
      'SHA256SUMS has the same sums, and that of this file: "sha256sum -c SHA256SUMS" in this folder checks all of them.',
      `In the tables a point marks decimals, numbers have all their digits, and an empty cell is a value that is not there. ${unitWords(input)}`,
      ...missing
    ]),
    titled('How to compute it again'),
    again(input, folder, hasShots),
    titled('What to keep in mind'),
    bullets(document.cautions)
  ].join('\n\n')}\n`;
}

const titled = (title: string): string => `${title}\n${'-'.repeat(title.length)}`;

function unitWords({ document: { data } }: BundleInput): string {
  const unit =
    data.unit === 'pair'
      ? 'counts.csv counts defects, as they were given; every other table counts pairs, half as many.'
      : 'All tables count defects.';
  const lump = data.lump
    ? ' The row marked "or more" (in counts.csv, +) takes together all counts from there on.'
    : '';
  const below = data.below
    ? ' The row marked "or fewer" (in counts.csv, from 0- on) takes together all counts up to there.'
    : '';
  return unit + below + lump;
}

function again({ document, supplied }: BundleInput, folder: string, hasShots: boolean): string {
  const { ordered, batches } = document.data;
  const command = recomputeCommand(document, {
    counts: `${folder}/${hasShots ? 'shots.csv' : 'counts.csv'}`,
    format: hasShots ? 'shots' : 'counts',
    supplied: supplied ? `${folder}/supplied.csv` : null
  });
  const order =
    batches === null ? 'of the order of the shots' : 'of the order of the shots and of the batches';
  const needs = hasShots
    ? `It reads shots.csv: the tests ${order} need the shots one by one. counts.csv gives the same counts and the same digest without them.`
    : ordered
      ? `The tests ${order} need the shots one by one, which are not in this bundle: what is computed from counts.csv lacks them, and with them p-values adjusted for all tests, and possibly flags and answer. The rest is the same.`
      : `It reads counts.csv, whose digest is the one in the document: ${document.data.digest}.`;
  return [
    wrap(
      `You need Severalty with engine ${document.engine.version}, which made this report (another engine may differ in some digits), and Node 20.11 or newer. Unpack the zip in the folder of Severalty, so that ${folder} lies in it. There, in one line:`
    ),
    `${command} > ${folder}/recomputed.json`,
    wrap(needs),
    wrap('Then compare, byte for byte; nothing is printed when the two are the same:'),
    `cmp ${folder}/document.json ${folder}/recomputed.json`,
    wrap(
      'On Windows do both in a Command Prompt, since PowerShell changes the bytes it writes, with "fc /b" in place of cmp. Without --json the command prints the report in words, and with --help all its options.'
    )
  ].join('\n\n');
}
