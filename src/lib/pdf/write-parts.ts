import PDFDocument from 'pdfkit';
import type { Part } from './blocks/blocks';
import { setPart } from './blocks/set-part';
import { Flow } from './page/flow';
import { escapeMetadata } from './page/metadata';
import { packObjects } from './page/pack-objects';
import { joined, packStreams } from './page/pack-streams';
import { pageFeet } from './page/page-feet';
import { cleanText } from './type/clean-text';
import { ALWAYS, type FontSource } from './type/fonts';
import { Pen } from './type/pen';

/** A document before it is set on pages. */
export interface Parts {
  /** Title, subject and dates of the file. */
  info: Record<string, string | Date>;
  /** The first page, which answers. */
  answer: Part;
  parts: Part[];
  /** Left of the page number. */
  foot: string;
  /** All that people typed or that says more than the program's own words: its signs decide which fonts are needed. */
  said: unknown;
}

export interface WriteOptions {
  /** False leaves the pages readable as text, for tests; true by default. */
  compress?: boolean;
}

/**
 * Parts as a PDF for print, A4: tagged for screen readers (PDF/UA), with an outline and embedded fonts. The same parts
 * give the same bytes: no clock is read.
 *
 * @param fonts where the font files come from: another place on the server than in the browser
 */
export async function writeParts(
  { info, answer, parts, foot, said }: Parts,
  fonts: FontSource,
  { compress = true }: WriteOptions = {}
): Promise<Uint8Array<ArrayBuffer>> {
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
    compress,
    // No standard font: everything is embedded.
    font: '',
    info
  };
  // pdfkit knows the subset PDF/UA, its types do not yet.
  const doc = new PDFDocument(asked as PDFKit.PDFDocumentOptions);
  escapeMetadata(doc);
  packStreams(doc);
  const written = gathered(doc);
  const pen = new Pen(doc);
  for (const name of ALWAYS) pen.addFont(name, await fonts(name));
  if (needsAnyFont(said, pen)) pen.addFont('any', await fonts('any'));

  const root = doc.struct('Document');
  doc.addStructure(root);
  const flow = new Flow(pen, root, () => {
    // Readers step through links and the like in the order of the tags.
    (doc.page.dictionary.data as Record<string, unknown>).Tabs = 'S';
  });
  setPart(flow, answer, { rule: false });
  // The answer has its page to itself.
  if (flow.pageNumber === 1) flow.newPage();
  for (const [i, part] of parts.entries()) {
    await others();
    setPart(flow, part, { rule: true, ...(i === parts.length - 2 && { last: parts[i + 1] }) });
  }
  flow.finish();
  root.end();
  pageFeet(pen, foot);
  await others();
  doc.end();
  return compress ? packObjects(await written) : written;
}

/** Lets whatever else waits have its turn: a PDF takes half a second, in which a server would answer nobody. */
const others = (): Promise<void> => new Promise((go) => setTimeout(go, 0));

/** Whether something said has signs that neither the text nor the symbol font draws. */
function needsAnyFont(said: unknown, pen: Pen): boolean {
  return [...new Set(cleanText(JSON.stringify(said)))].some((sign) => {
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
