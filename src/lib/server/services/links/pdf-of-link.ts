import type { LinkView } from '$lib/model/link/shown-by-link';
import { readDocument } from '$lib/model/read-document';
import type { Provenance } from '$lib/pdf/report-input';

export type PdfOfLink =
  { ok: true; bytes: Uint8Array<ArrayBuffer> } | { ok: false; reason: 'unreadable'; problem: string };

/**
 * What a link shows, as a PDF: the report, or what is left of it where the counts are kept back. It is made from the
 * view alone, so that it can say no more than the page. The link's own address opens it, and stays out of the file.
 */
export async function pdfOfLink({ origin, times, content }: LinkView): Promise<PdfOfLink> {
  const provenance: Provenance = {
    madeBy: origin?.madeBy ?? null,
    madeAt: origin ? new Date(origin.madeAt) : null,
    team: origin?.team ?? null,
    dataset: origin?.dataset ?? null,
    conditions: { ...times, ...origin },
    link: null
  };
  // Loaded when first asked for: its fonts are a megabyte.
  const { writeReport, writeSummary } = await import('../../pdf/write-report');
  if (content.kind === 'without-counts')
    return { ok: true, bytes: await writeSummary({ summary: content.summary, provenance }) };
  const read = readDocument(content.document);
  if (!read.ok) return { ok: false, reason: 'unreadable', problem: read.problem };
  const input = { document: read.diagnosis, documentSha256: content.sha256, provenance };
  return { ok: true, bytes: await writeReport(input) };
}
