import { chartFiles } from '$lib/charts/chart-files';
import { bundleFiles } from '$lib/model/exports/bundle-files';
import { withheldFiles } from '$lib/model/exports/withheld-files';
import { zipBundle } from '$lib/model/exports/zip-bundle';
import { bundleOfLink } from '$lib/server/services/links/bundle-of-link';
import { askLinkFile } from '../../../ask-link';
import { unreadable } from '../../../unreadable';
import { linkFile } from '../link-file';
import type { RequestHandler } from './$types';

/** Everything that the link shows as a zip. */
export const GET: RequestHandler = async (event) => {
  const asked = await askLinkFile(event);
  if (!asked.ok) return asked.response;
  const made = await bundleOfLink(asked.view);
  if (!made.ok) return unreadable(made.problem);
  const bundle =
    made.kind === 'whole'
      ? bundleFiles({ ...made.input, charts: chartFiles(made.input.document, made.dataset) })
      : withheldFiles(made.summary, made.about);
  return linkFile(zipBundle(bundle), `${asked.view.fileName}.zip`, 'application/zip');
};
