import { documentText } from '$lib/model/document-text';
import { reportPdf } from '$lib/pdf/report-pdf';
import type { Diagnosis } from '$lib/stats/types';
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import { pageFonts } from './fonts';

export interface PdfRequest {
  document: Diagnosis;
  /** Name of the dataset; null when it has none. */
  name: string | null;
}

export type PdfAnswer = { ok: true; bytes: Uint8Array<ArrayBuffer> } | { ok: false; message: string };

const say = (answer: PdfAnswer): void => self.postMessage(answer);

/** The report of a page that keeps its counts: the same bytes as `diagnose --pdf` writes. */
self.onmessage = async ({ data: { document, name } }: MessageEvent<PdfRequest>) => {
  try {
    const documentSha256 = bytesToHex(sha256(utf8ToBytes(documentText(document))));
    const unsaid = { madeBy: null, madeAt: null, team: null, conditions: null, link: null };
    const input = { document, documentSha256, provenance: { ...unsaid, dataset: name } };
    say({ ok: true, bytes: await reportPdf(input, pageFonts) });
  } catch (error) {
    say({ ok: false, message: error instanceof Error ? error.message : String(error) });
  }
};
