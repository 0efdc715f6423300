import { cautionsPart } from './parts/method';
import { sweepAnswerPart } from './parts/sweep-answer';
import { sweepAnswersPart } from './parts/sweep-answers';
import { sweepLawsPart } from './parts/sweep-laws';
import { sweepMethodPart } from './parts/sweep-method';
import { sweepPointsPart } from './parts/sweep-points';
import { sweepProvenancePart } from './parts/sweep-provenance';
import { sweepRatiosParts } from './parts/sweep-ratios';
import type { SweepPdfInput } from './sweep-input';
import { cleanText } from './type/clean-text';
import type { FontSource } from './type/fonts';
import { writeParts, type WriteOptions } from './write-parts';

/**
 * A sweep as a PDF for print: its answer with what it cannot tell on the first page, then power laws and windows, ratios,
 * the answers along the axis, and every number. The same input gives the same bytes.
 */
export function sweepPdf(
  input: SweepPdfInput,
  fonts: FontSource,
  options?: WriteOptions
): Promise<Uint8Array<ArrayBuffer>> {
  const { document, documentSha256, engineVersion, name, madeBy, madeAt } = input;
  const date = madeAt ?? new Date(0);
  return writeParts(
    {
      info: {
        Title: `Severalty sweep${name ? `: ${cleanText(name)}` : ''}`,
        Subject: document.statement,
        Creator: `Severalty ${engineVersion}`,
        Producer: 'pdfkit 0.20.2',
        CreationDate: date,
        ModDate: date,
        ...(madeBy ? { Author: cleanText(madeBy) } : {})
      },
      answer: sweepAnswerPart(input),
      parts: [
        sweepLawsPart(document),
        ...sweepRatiosParts(document),
        sweepAnswersPart(document),
        sweepPointsPart(input),
        sweepMethodPart(),
        sweepProvenancePart(input),
        cautionsPart(document)
      ],
      foot: `Severalty ${engineVersion}. Sweep of ${document.points.length} datasets, document ${documentSha256.slice(0, 12)}…`,
      said: input
    },
    fonts,
    options
  );
}
