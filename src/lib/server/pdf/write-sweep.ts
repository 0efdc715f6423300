import type { SweepPdfInput } from '$lib/pdf/sweep-input';
import { sweepPdf } from '$lib/pdf/sweep-pdf';
import { serverFonts } from './fonts';

/** A sweep as a PDF, on the server: see sweepPdf. */
export const writeSweep = (input: SweepPdfInput): Promise<Uint8Array<ArrayBuffer>> =>
  sweepPdf(input, serverFonts);
