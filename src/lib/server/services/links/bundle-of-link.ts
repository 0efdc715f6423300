import type { BundleInput } from '$lib/model/exports/bundle-input';
import type { Summary } from '$lib/model/link/summary';
import type { LinkView } from '$lib/model/link/shown-by-link';
import { readDocument } from '$lib/model/read-document';
import { pdfOfLink } from './pdf-of-link';

export type BundleOfLink =
  | { ok: true; kind: 'whole'; input: Omit<BundleInput, 'charts'>; dataset: string | null }
  | { ok: true; kind: 'without-counts'; summary: Summary; about: string[] }
  | { ok: false; problem: string };

/**
 * What a bundle of a link holds: what its page shows and no more. Blind tells nothing of whose it is, nor the
 * conditions; kept-back counts leave the summary. The uploaded file and the token of the link never come along.
 */
export async function bundleOfLink(view: LinkView): Promise<BundleOfLink> {
  const { origin, times, content } = view;
  const about = origin
    ? [
        `Report ${origin.number} of ${origin.dataset}, team ${origin.team}. Made ${origin.madeBy === null ? '' : `by ${origin.madeBy}, `}${new Date(origin.madeAt).toISOString().slice(0, 10)}.`
      ]
    : [];
  if (content.kind === 'without-counts')
    return { ok: true, kind: 'without-counts', summary: content.summary, about };
  const read = readDocument(content.document);
  if (!read.ok) return { ok: false, problem: read.problem };
  const conditions = origin && {
    name: origin.dataset,
    device: origin.device,
    firmware: origin.firmware,
    group: origin.group,
    ...times,
    trialsWhy: origin.trialsWhy,
    postSelection: origin.postSelection,
    measuredOn: origin.measuredOn,
    notes: origin.notes
  };
  const pdf = await pdfOfLink(view);
  if (!pdf.ok) return { ok: false, problem: pdf.problem };
  return {
    ok: true,
    kind: 'whole',
    dataset: origin?.dataset ?? null,
    input: {
      document: read.diagnosis,
      documentText: content.document,
      data: content.counts,
      supplied: content.options.supplied,
      about,
      conditions,
      pdf: pdf.bytes,
      original: null
    }
  };
}
