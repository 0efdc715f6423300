import { pdfOfSweepLink } from '$lib/server/services/links/pdf-of-sweep-link';
import { askLinkSweepFile } from '../../../../ask-link';
import { unreadable } from '../../../../unreadable';
import { linkFile } from '../../link-file';
import type { RequestHandler } from './$types';

/** The sweep that the link shows, for print. */
export const GET: RequestHandler = async (event) => {
  const asked = await askLinkSweepFile(event);
  if (!asked.ok) return asked.response;
  const bytes = await pdfOfSweepLink(asked.view);
  if (!bytes) return unreadable('its bytes do not have their sha256', 'sweep');
  return linkFile(bytes, `${asked.view.fileName}.pdf`, 'application/pdf', 'sweep');
};
