import type { ReportInput } from '$lib/pdf/report-input';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from './fonts';

/** A report as a PDF, on the server or the command line: see reportPdf. */
export const writeReport = (input: ReportInput): Promise<Uint8Array<ArrayBuffer>> =>
  reportPdf(input, serverFonts);
