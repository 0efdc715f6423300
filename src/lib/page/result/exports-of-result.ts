import { saveFile } from '$lib/charts/save-file';
import { documentText } from '$lib/model/document-text';
import type { Result } from '../result-types';
import { EXPORTS, type ExportFile } from './export-files';

/** Files that this page makes itself, nothing sent; what makes them is loaded when it is asked for. */
export function exportsOfResult(result: Result): ExportFile[] {
  const { diagnosis } = result;
  const csv = (name: string, text: string) => saveFile(`severalty-${name}.csv`, text, 'text/csv');
  return [
    {
      ...EXPORTS.bundle,
      what: `${EXPORTS.bundle.what} The report for print is in it. Made by this browser.`,
      save: async () => (await import('./save-bundle')).saveBundle(result)
    },
    {
      ...EXPORTS.document,
      save: async () => saveFile('severalty-diagnosis.json', documentText(diagnosis), 'application/json')
    },
    {
      ...EXPORTS.numbers,
      save: async () => csv('numbers', (await import('$lib/model/document-csv')).documentCsv(diagnosis))
    },
    {
      ...EXPORTS.distribution,
      save: async () =>
        csv('distribution', (await import('$lib/model/exports/distribution-csv')).distributionCsv(diagnosis))
    },
    {
      ...EXPORTS.tails,
      save: async () => csv('tails', (await import('$lib/model/exports/tails-csv')).tailsCsv(diagnosis))
    }
  ];
}
