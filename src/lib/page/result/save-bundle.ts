import { chartFiles } from '$lib/charts/chart-files';
import { saveFile } from '$lib/charts/save-file';
import { documentText } from '$lib/model/document-text';
import { bundleFiles } from '$lib/model/exports/bundle-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import type { Result } from '../result-types';

/** Everything about a result as a zip, made in this browser. The report for print needs a server, and is left out. */
export function saveBundle({ diagnosis, data, options, name }: Result): void {
  const bundle = bundleFiles({
    document: diagnosis,
    documentText: documentText(diagnosis),
    data,
    supplied: options.supplied,
    about: name === null ? [] : [`Made in a browser from ${name}.`],
    conditions: null,
    pdf: null,
    charts: chartFiles(diagnosis, name),
    original: null
  });
  saveFile(`${bundle.folder}.zip`, new Blob([zipBundle(bundle)], { type: 'application/zip' }));
}
