import type { ReportInput } from '$lib/pdf/report-input';
import { reportPdf } from '$lib/pdf/report-pdf';
import { summaryPdf, type SummaryInput } from '$lib/pdf/summary-pdf';
import { serverFonts } from './fonts';

/** A report as a PDF, on the server or the command line: see reportPdf. */
export const writeReport = (input: ReportInput): Promise<Uint8Array<ArrayBuffer>> =>
  reportPdf(input, serverFonts);

/** A report without its counts as a PDF: see summaryPdf. */
export const writeSummary = (input: SummaryInput): Promise<Uint8Array<ArrayBuffer>> =>
  summaryPdf(input, serverFonts);
