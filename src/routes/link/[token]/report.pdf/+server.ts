import { pdfOfLink } from '$lib/server/services/links/pdf-of-link';
import { askLinkFile } from '../../../ask-link';
import { problem } from '../../../problem';
import type { RequestHandler } from './$types';

/** What the link shows, for print. */
export const GET: RequestHandler = async (event) => {
  const asked = await askLinkFile(event);
  if (!asked.ok) return asked.response;
  const made = await pdfOfLink(asked.view);
  if (!made.ok)
    return problem({
      status: 500,
      code: 'unreadable',
      title: `The document of this report cannot be read: ${made.problem}.`,
      detail: 'Its bytes are kept: take them as JSON.'
    });
  return new Response(made.bytes, {
    headers: {
      'content-type': 'application/pdf',
      'content-disposition': `attachment; filename="severalty-report.pdf"; filename*=UTF-8''${encodeURIComponent(asked.view.fileName)}.pdf`
    }
  });
};
