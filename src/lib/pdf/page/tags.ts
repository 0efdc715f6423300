import type { Flow } from './flow';

export type Element = PDFKit.PDFStructureElement;

interface ElementOptions {
  alt?: string;
  title?: string;
  bbox?: [number, number, number, number];
  scope?: 'Row' | 'Column';
}

/** A structure element below `parent`: what a screen reader walks through. */
export function tag(
  doc: PDFKit.PDFDocument,
  parent: Element,
  type: string,
  options: ElementOptions = {}
): Element {
  const element = doc.struct(type, options as PDFKit.Mixins.StructureElementOptions);
  parent.add(element);
  return element;
}

/** Marks what `draw` draws as content of the element. May be called again, also on another page. */
export function mark(doc: PDFKit.PDFDocument, element: Element, type: string, draw: () => void): void {
  const content = doc.markStructureContent(type);
  draw();
  doc.endMarkedContent();
  element.add(content);
}

/** A new element whose content is what `draw` draws. */
export function tagged(
  flow: Flow,
  parent: Element,
  type: string,
  draw: () => void,
  options?: ElementOptions
): Element {
  const element = tag(flow.doc, parent, type, options);
  mark(flow.doc, element, type, draw);
  return element;
}

/** Draws what only adorns: rules, samples, page numbers. It is not read out. */
export function adorn(doc: PDFKit.PDFDocument, draw: () => void): void {
  doc.markContent('Artifact', { type: 'Layout' });
  draw();
  doc.endMarkedContent();
}
