import type { SweepView } from '$lib/model/link/sweep-by-link';
import type { SweepReport } from '$lib/stats/sweep/types';
import { createHash } from 'node:crypto';

/**
 * What a link shows of a sweep, as a PDF; null where its bytes are damaged. It is made from the view alone, so that it
 * can say no more than the page; its sha256 is that of the JSON which the same link gives out. The link's own address
 * opens it, and stays out of the file.
 */
export async function pdfOfSweepLink(view: SweepView): Promise<Uint8Array<ArrayBuffer> | null> {
  const { origin, engineVersion, document } = view;
  if (document === null) return null;
  // Loaded when first asked for: its fonts are a megabyte.
  const { writeSweep } = await import('../../pdf/write-sweep');
  return writeSweep({
    document: JSON.parse(document) as SweepReport,
    documentSha256: createHash('sha256').update(document).digest('hex'),
    engineVersion,
    name: origin?.name ?? null,
    notes: origin?.notes ?? null,
    madeBy: origin?.madeBy ?? null,
    madeAt: origin ? new Date(origin.madeAt) : null,
    team: origin?.team ?? null,
    sources: null,
    link: null
  });
}
