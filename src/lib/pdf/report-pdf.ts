import PDFDocument from 'pdfkit';
import { setPart } from './blocks/set-part';
import { Flow } from './page/flow';
import { escapeMetadata, infoOf } from './page/metadata';
import { joined, packStreams } from './page/pack-streams';
import { pageFeet } from './page/page-feet';
import { answerPart } from './parts/answer';
import { cumulantsPart } from './parts/cumulants';
import { dataPart } from './parts/data';
import { flagsPart } from './parts/flags';
import { lawPart } from './parts/law';
import { cautionsPart, methodPart } from './parts/method';
import { provenancePart } from './parts/provenance';
import { ratePart } from './parts/rate';
import { tailsPart } from './parts/tails';
import { testsPart } from './parts/tests';
import type { ReportInput } from './report-input';
import { cleanText } from './type/clean-text';
import { ALWAYS, type FontSource } from './type/fonts';
import { Pen } from './type/pen';

/**
 * A diagnosis as a PDF for print: the answer on the first page, then everything behind it in the order in which a
 * sceptic asks. Tagged for screen readers, with an outline and embedded fonts; A4.
 *
 * The same input gives the same bytes: no clock is read, and without a time of its own the file is dated 1970.
 *
 * @param fonts where the font files come from: another place on the server than in the browser
 * @param options.compress false leaves the pages readable as text, for tests; true by default
 */
export async function reportPdf(
  input: ReportInput,
  fonts: FontSource,
  options: { compress?: boolean } = {}
): Promise<Uint8Array<ArrayBuffer>> {
  const { document, provenance } = input;
  const asked = {
    size: 'A4',
    margin: 0,
    autoFirstPage: false,
    bufferPages: true,
    pdfVersion: '1.7',
    subset: 'PDF/UA',
    tagged: true,
    lang: 'en',
    displayTitle: true,
    compress: options.compress ?? true,
    // No standard font: everything is embedded.
    font: '',
    info: infoOf(document, provenance)
  };
  // pdfkit knows the subset PDF/UA, its types do not yet.
  const doc = new PDFDocument(asked as PDFKit.PDFDocumentOptions);
  escapeMetadata(doc);
  packStreams(doc);
  const written = gathered(doc);
  const pen = new Pen(doc);
  for (const name of ALWAYS) pen.addFont(name, await fonts(name));
  if (needsAnyFont(input, pen)) pen.addFont('any', await fonts('any'));

  const root = doc.struct('Document');
  doc.addStructure(root);
  const flow = new Flow(pen, root, () => {
    // Readers step through links and the like in the order of the tags.
    (doc.page.dictionary.data as Record<string, unknown>).Tabs = 'S';
  });
  setPart(flow, answerPart(input), { rule: false });
  // The answer has its page to itself.
  if (flow.pageNumber === 1) flow.newPage();
  for (const part of [
    dataPart(input),
    lawPart(document),
    ratePart(document),
    tailsPart(document),
    cumulantsPart(document),
    testsPart(document),
    flagsPart(document),
    methodPart(),
    provenancePart(input),
    cautionsPart(document)
  ])
    setPart(flow, part, { rule: true });
  flow.finish();
  root.end();
  pageFeet(pen, footOf(input));
  doc.end();
  return written;
}

const footOf = ({ document: { engine, data } }: ReportInput): string =>
  `Severalty ${engine.version}. Counts ${data.digest.slice(0, 19)}…, seed ${engine.seed}.`;

/** Whether a name or a note has signs that neither the text nor the symbol font draws. */
function needsAnyFont({ provenance, document }: ReportInput, pen: Pen): boolean {
  const said = cleanText(JSON.stringify([provenance, document.flags, document.answer, document.cautions]));
  return [...new Set(said)].some((sign) => {
    const point = sign.codePointAt(0) ?? 0;
    return !pen.has('text', point) && !pen.has('symbols', point);
  });
}

function gathered(doc: PDFKit.PDFDocument): Promise<Uint8Array<ArrayBuffer>> {
  return new Promise((done, failed) => {
    const parts: Uint8Array[] = [];
    doc.on('data', (part: Uint8Array) => parts.push(part));
    doc.on('end', () => done(joined(parts)));
    doc.on('error', failed);
  });
}
