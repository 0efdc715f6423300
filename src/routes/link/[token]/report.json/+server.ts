import { summaryText } from '$lib/model/link/summary-text';
import { askLinkJson } from '../../../ask-link';
import { linkFile } from '../link-file';
import type { RequestHandler } from './$types';

/** The document byte for byte as it is stored, or what is left of it where the link keeps the counts back. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkJson(event, 'see');
  if (!asked.ok) return asked.response;
  const { content, fileName } = asked.view;
  const text = content.kind === 'whole' ? content.document : summaryText(content.summary);
  return linkFile(text, `${fileName}.json`, 'application/json');
};
