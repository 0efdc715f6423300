import { chartFiles } from '$lib/charts/chart-files';
import { saveFile } from '$lib/charts/save-file';
import { documentText } from '$lib/model/document-text';
import { bundleFiles } from '$lib/model/exports/bundle-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import type { Diagnosis } from '$lib/stats/types';
import { makePdf } from '../pdf/make-pdf';
import type { Result } from '../result-types';

/** Everything about a result as a zip, the report for print too, all made in this browser. */
export async function saveBundle({ diagnosis, data, options, name }: Result): Promise<void> {
  const text = documentText(diagnosis);
  // A plain copy, since what the page keeps cannot be sent to a worker as it is.
  const made = await makePdf({ document: JSON.parse(text) as Diagnosis, name });
  const bundle = bundleFiles({
    document: diagnosis,
    documentText: text,
    data,
    supplied: options.supplied,
    about: name === null ? [] : [`Made in a browser from ${name}.`],
    conditions: null,
    // Without it the README says that it is missing, and how to make it.
    pdf: made.ok ? made.bytes : null,
    charts: chartFiles(diagnosis, name),
    original: null
  });
  saveFile(`${bundle.folder}.zip`, new Blob([zipBundle(bundle)], { type: 'application/zip' }));
}
