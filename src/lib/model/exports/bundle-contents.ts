import { digest } from '$lib/stats/input/digest';
import { toHistogram } from '$lib/stats/input/to-histogram';
import type { CountData, Histogram } from '$lib/stats/types';
import { documentCsv } from '../document-csv';
import { bundleFile } from './bundle-file';
import type { BundleFile, BundleInput } from './bundle-input';
import { countsCsv } from './counts-csv';
import { distributionCsv } from './distribution-csv';
import { rateCsv } from './rate-csv';
import { tailsCsv } from './tails-csv';

const CHARTS: Record<string, string> = {
  distribution: 'counts against the best law',
  'rate-function': 'the rate function and the shot horizon',
  'tails-and-bounds': 'both tails and the bounds on them',
  ceiling: 'variance and ceiling',
  'cumulants-region': 'where the cumulants lie, and where those of independent trials can',
  tests: 'the tests',
  explanations: 'what else it could be, best first'
};

/** The files of a bundle that hold the report itself, in the order in which a reader wants them. */
export function bundleContents(input: BundleInput): BundleFile[] {
  const { document, documentText, supplied, conditions, pdf, charts, original } = input;
  const shots = shotList(input);
  const files: BundleFile[] = [];
  const add = (path: string, what: string, content: string | Uint8Array) =>
    files.push(bundleFile(path, what, content));
  add(
    'document.json',
    'the report itself, byte for byte as it is kept; everything else follows from it',
    documentText
  );
  if (pdf) add('report.pdf', 'the report for print', pdf);
  add('counts.csv', 'the counts: how many shots had how many defects', countsCsv(histogramOf(input)));
  if (shots) add('shots.csv', 'the shots in the order in which they were taken', countsCsv(shots));
  if (supplied)
    add('supplied.csv', 'the law that was given to compare with, a probability a line', listOf(supplied));
  add('numbers.csv', 'every number of the report, one a line, with its interval', documentCsv(document));
  add(
    'distribution.csv',
    'a row a count: shots, share with its 95 % interval, best law',
    distributionCsv(document)
  );
  add('tails.csv', 'a row a tail: shots, share with its 95 % interval, best law, bounds', tailsCsv(document));
  add('rate.csv', 'a row a count: the rate function, in nats', rateCsv(document));
  for (const [name, svg] of Object.entries(charts))
    add(`charts/${name}.svg`, `chart: ${CHARTS[name] ?? name}`, svg);
  if (conditions)
    add(
      'conditions.json',
      'under what conditions it was measured',
      `${JSON.stringify(conditions, null, 2)}\n`
    );
  if (original)
    add(`original/${original.name}`, 'the file of counts as it came, byte for byte', original.bytes);
  return files;
}

/** The shots in their order, when they are those of the document. */
export function shotList({ document, data }: Pick<BundleInput, 'document' | 'data'>): CountData | null {
  if (!document.data.ordered || data?.kind !== 'shots') return null;
  return digest(toHistogram(data)) === document.data.digest ? data : null;
}

const histogramOf = ({ document: { data } }: BundleInput): Histogram => ({
  kind: 'histogram',
  counts: data.counts,
  lump: data.lump,
  ...(data.below && { below: data.below })
});

const listOf = (probabilities: number[]): string => probabilities.map((p) => `${p}\r\n`).join('');
