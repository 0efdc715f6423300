import type { PdfAnswer, PdfRequest } from './pdf.worker';

/**
 * A report as a PDF, written in this browser: the counts go nowhere. The writer and its fonts, about a megabyte, come
 * from the server when this is first called.
 */
export function makePdf(request: PdfRequest): Promise<PdfAnswer> {
  const worker = new Worker(new URL('./pdf.worker.ts', import.meta.url), { type: 'module' });
  return new Promise<PdfAnswer>((resolve) => {
    worker.onmessage = ({ data }: MessageEvent<PdfAnswer>) => resolve(data);
    worker.onerror = (event) =>
      resolve({ ok: false, message: event.message || 'The PDF writer could not be loaded.' });
    worker.postMessage(request);
  }).finally(() => worker.terminate());
}
