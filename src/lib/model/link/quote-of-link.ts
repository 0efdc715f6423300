import type { Diagnosis } from '$lib/stats/types';
import { olderDocument } from '../older-document';
import { printedQuote, type PrintedQuote } from '../quote/printed-quote';
import type { LinkView } from './shown-by-link';

/**
 * Words to quote of what a link shows, made of its view alone: they can say no more than the page. A blind link has no
 * origin, and nothing is cited but its address and the digest of what it shows.
 *
 * @param url address of the page
 */
export function quoteOfLink({ origin, content }: LinkView, url: string): PrintedQuote {
  const document =
    content.kind === 'whole' ? (olderDocument(JSON.parse(content.document)) as Diagnosis) : content.summary;
  return printedQuote(document, {
    name: origin?.dataset ?? null,
    device: origin?.device ?? null,
    firmware: origin?.firmware ?? null,
    group: origin?.group ?? null,
    team: origin?.team ?? null,
    number: origin?.number ?? null,
    madeAt: origin?.madeAt ?? null,
    sha256: content.kind === 'whole' ? content.sha256 : null,
    url
  });
}
