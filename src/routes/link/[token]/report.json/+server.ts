import { askLinkJson } from '../../../ask-link';
import type { RequestHandler } from './$types';

/** The document byte for byte as it is stored, or what is left of it where the link keeps the counts back. */
export const GET: RequestHandler = (event) => {
  const asked = askLinkJson(event, 'see');
  if (!asked.ok) return asked.response;
  const { content, fileName } = asked.view;
  const text = content.kind === 'whole' ? content.document : `${JSON.stringify(content.summary, null, 2)}\n`;
  return new Response(text, {
    headers: {
      'content-type': 'application/json',
      'content-disposition': `attachment; filename="severalty-report.json"; filename*=UTF-8''${encodeURIComponent(fileName)}.json`
    }
  });
};
