import { askLinkSweepJson } from '../../../../ask-link';
import { unreadable } from '../../../../unreadable';
import { linkFile } from '../../link-file';
import type { RequestHandler } from './$types';

/** The document of the sweep, byte for byte as it is stored; without names where the link is blind. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkSweepJson(event);
  if (!asked.ok) return asked.response;
  const { document, fileName } = asked.view;
  if (document === null) return unreadable('its bytes do not have their sha256', 'sweep');
  return linkFile(document, `${fileName}.json`, 'application/json', 'sweep');
};
