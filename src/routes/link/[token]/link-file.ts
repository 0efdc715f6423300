import { readDocument } from '$lib/model/read-document';
import type { LinkView } from '$lib/model/link/shown-by-link';
import type { BundleInput } from '$lib/model/exports/bundle-input';
import { problem } from '../../problem';
import { unreadable } from '../../unreadable';

/** A file that a link gives out; `name` may hold letters of any script (RFC 6266). */
export const linkFile = (
  body: BodyInit,
  name: string,
  type: string,
  of: 'report' | 'sweep' = 'report'
): Response =>
  new Response(body, {
    headers: {
      'content-type': type,
      'content-disposition': `attachment; filename="severalty-${of}.${name.split('.').pop()}"; filename*=UTF-8''${encodeURIComponent(name)}`
    }
  });

/** A table of the document, where the link shows the counts it is made from. */
export function linkCsv(
  { content, fileName }: LinkView,
  which: string,
  table: (document: BundleInput['document']) => string
): Response {
  if (content.kind === 'without-counts')
    return problem({
      status: 403,
      code: 'without-counts',
      title: 'This link keeps the counts back, and with them the tables made from them.',
      detail: 'Ask the team for a link that shows the counts.'
    });
  const read = readDocument(content.document);
  if (!read.ok) return unreadable(read.problem);
  return linkFile(table(read.diagnosis), `${fileName}-${which}.csv`, 'text/csv; charset=utf-8');
}
