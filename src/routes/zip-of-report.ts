import { chartFiles } from '$lib/charts/chart-files';
import { bundleFiles } from '$lib/model/exports/bundle-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import type { BundleOfReport } from '$lib/server/services/reports/bundle-of-report';

/** What the database gave for a bundle as its zip, with the charts that services may not draw. */
export const zipOfReport = ({
  input,
  name
}: Extract<BundleOfReport, { ok: true }>): Uint8Array<ArrayBuffer> =>
  zipBundle(bundleFiles({ ...input, charts: chartFiles(input.document, name) }));
