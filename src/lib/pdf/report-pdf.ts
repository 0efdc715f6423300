import { infoOf } from './page/metadata';
import { answerPart } from './parts/answer';
import { cumulantsPart } from './parts/cumulants';
import { dataPart } from './parts/data';
import { explanationsParts } from './parts/explanations';
import { flagsPart } from './parts/flags';
import { lawPart } from './parts/law';
import { cautionsPart, methodPart } from './parts/method';
import { nuisancesPart } from './parts/nuisances';
import { provenancePart } from './parts/provenance';
import { ratePart } from './parts/rate';
import { tailsPart } from './parts/tails';
import { testsPart } from './parts/tests';
import type { ReportInput } from './report-input';
import type { FontSource } from './type/fonts';
import { writeParts, type WriteOptions } from './write-parts';

/**
 * A diagnosis as a PDF for print: the answer on the first page, then everything behind it in the order in which a
 * sceptic asks. The same input gives the same bytes; without a time of its own the file is dated 1970.
 */
export function reportPdf(
  input: ReportInput,
  fonts: FontSource,
  options?: WriteOptions
): Promise<Uint8Array<ArrayBuffer>> {
  const { document, provenance } = input;
  const { engine, data, flags, answer, cautions } = document;
  return writeParts(
    {
      info: infoOf(document, provenance, ` Counts ${data.digest}`),
      answer: answerPart(input),
      parts: [
        dataPart(input),
        lawPart(document),
        ratePart(document),
        tailsPart(document),
        cumulantsPart(document),
        testsPart(document),
        flagsPart(document),
        ...explanationsParts(document.explanations, document.engine.alpha),
        nuisancesPart(input),
        methodPart(),
        provenancePart(input),
        cautionsPart(document)
      ],
      foot: `Severalty ${engine.version}. Counts ${data.digest.slice(0, 19)}…, seed ${engine.seed}.`,
      said: [provenance, flags, answer, cautions]
    },
    fonts,
    options
  );
}
