import { inflateSync } from 'node:zlib';

/** One marked stretch of a page: its tag, and its text with a blank for each line end. */
export interface Marked {
  page: number;
  tag: string;
  /** Its number on the page, by which the tree of tags names it; null for adornments. */
  id: number | null;
  text: string;
}

export interface ReadPdf {
  objects: Map<number, string>;
  pages: number;
  marked: Marked[];
  /** All of it as it is read out: in the order of the tags, thin and no-break spaces as blanks, no blank twice. */
  text: string;
  /** Pieces of text outside all marks, which no screen reader finds. */
  unmarked: string[];
}

/** Every space a plain one, so that sentences compare. */
export const plainSpaces = (text: string): string => text.replace(/[\s\u00a0\u2009\u202f]+/g, ' ').trim();

const reference = (text: string, key: string): number =>
  Number(text.match(new RegExp(`/${key} (\\d+) 0 R`))?.[1]);

/**
 * Reads the text of a PDF. Written for these tests: it knows what pdfkit writes (one xref table, fonts with ToUnicode,
 * hexadecimal strings), and nothing else.
 */
export function readPdf(bytes: Uint8Array): ReadPdf {
  const file = Buffer.from(bytes).toString('latin1');
  const xref = Number(file.match(/startxref\n(\d+)\n%%EOF/)?.[1]);
  const offsets = [...file.slice(xref).matchAll(/^(\d{10}) \d{5} n/gm)].map((entry) => Number(entry[1]));
  const ends = [...offsets, xref].sort((a, b) => a - b);
  const objects = new Map<number, string>();
  offsets.forEach((offset, i) => {
    const end = ends[ends.indexOf(offset) + 1];
    objects.set(i + 1, unpacked(file.slice(offset, end).replace(/^\d+ 0 obj\n/, '')));
  });
  const kids = [...objects.values()].find((text) => /\/Type \/Pages\b/.test(text)) ?? '';
  const order = [...(kids.match(/\/Kids \[([^\]]*)\]/)?.[1] ?? '').matchAll(/(\d+) 0 R/g)].map(([, id]) =>
    Number(id)
  );
  const marked: Marked[] = [];
  const unmarked: string[] = [];
  order.forEach((id, page) => readPage(objects, id, page, marked, unmarked));
  return {
    objects,
    pages: order.length,
    marked,
    text: plainSpaces(readOut(objects, order, marked)),
    unmarked
  };
}

/** An object with its stream as text, whether it was packed or not. */
function unpacked(object: string): string {
  const start = object.indexOf('stream\n') + 7;
  if (start < 7 || !object.slice(0, start).includes('/Filter /FlateDecode')) return object;
  const length = Number(object.match(/\/Length (\d+)/)?.[1]);
  const stream = Buffer.from(object.slice(start, start + length), 'latin1');
  return `${object.slice(0, start)}${inflateSync(stream).toString('latin1')}\nendstream`;
}

function readPage(
  objects: Map<number, string>,
  id: number,
  page: number,
  marked: Marked[],
  unmarked: string[]
): void {
  const dictionary = objects.get(id) ?? '';
  const resources = objects.get(reference(dictionary, 'Resources')) ?? '';
  const fonts = new Map<string, string[]>();
  for (const [, name, font] of resources.matchAll(/\/(F\d+) (\d+) 0 R/g)) {
    const cmap = objects.get(reference(objects.get(Number(font)) ?? '', 'ToUnicode')) ?? '';
    fonts.set(name, unicodeOf(cmap));
  }
  const content = objects.get(reference(dictionary, 'Contents')) ?? '';
  let [font, y, line] = ['', 0, Number.NaN];
  const open: Omit<Marked, 'page'>[] = [];
  for (const command of content.split('\n')) {
    const mark = command.match(/^\/(\w+) <</);
    if (mark) {
      open.push({ tag: mark[1], id: null, text: '' });
      line = Number.NaN;
    } else if (/^\/MCID /.test(command) && open.length > 0) {
      open[open.length - 1].id = Number(command.slice(6));
    } else if (command === 'EMC') {
      marked.push({ page, ...(open.pop() ?? { tag: '', id: null, text: '' }) });
    } else if (/ Tm$/.test(command)) y = Number(command.split(' ')[5]);
    else if (/ Tf$/.test(command)) font = command.split(' ')[0].slice(1);
    else if (/ TJ$/.test(command)) {
      const codes = [...command.matchAll(/<([0-9a-f]+)>/g)].flatMap(([, hex]) => hex.match(/.{4}/g) ?? []);
      const text = codes.map((code) => fonts.get(font)?.[parseInt(code, 16)] ?? '\ufffd').join('');
      const last = open.at(-1);
      if (!last) unmarked.push(text);
      // The same line, or a raised sign on it: no blank between.
      else last.text += Number.isNaN(line) || Math.abs(y - line) < 6 ? text : ` ${text}`;
      if (Number.isNaN(line) || Math.abs(y - line) >= 6) line = y;
    }
  }
}

/** Walks the tree of tags as a screen reader does. */
function readOut(objects: Map<number, string>, pages: number[], marked: Marked[]): string {
  const content = new Map(marked.map(({ page, id, text }) => [`${pages[page]} ${id}`, text]));
  const root = [...objects.values()].find((object) => /\/Type \/StructTreeRoot/.test(object)) ?? '';
  const walk = (object: string): string => {
    // Its kids on other pages name theirs.
    const page = reference(object.replace(/\/K \[[\s\S]*?\]/, ''), 'Pg');
    const kids = object.match(/\/K \[([\s\S]*?)\]/)?.[1] ?? '';
    const found = kids.matchAll(/<<([\s\S]*?)>>|(\d+) 0 R|(\d+)/g);
    return [...found]
      .map(([, inner, child, id]) => {
        if (child !== undefined) return walk(objects.get(Number(child)) ?? '');
        if (id !== undefined) return content.get(`${page} ${id}`) ?? '\ufffd';
        if (!inner.includes('/MCID')) return '';
        return content.get(`${reference(inner, 'Pg')} ${inner.match(/\/MCID (\d+)/)?.[1]}`) ?? '\ufffd';
      })
      .join(' ');
  };
  return walk(root);
}

/** Signs by glyph number, from the font's own map. */
function unicodeOf(cmap: string): string[] {
  const signs: string[] = [];
  for (const [, from, , list] of cmap.matchAll(/<(\w{4})> <(\w{4})> \[([^\]]*)\]/g))
    [...list.matchAll(/<([^>]*)>/g)].forEach(([, hex], i) => {
      const units = hex.replace(/ /g, '').match(/.{4}/g) ?? [];
      signs[parseInt(from, 16) + i] = String.fromCharCode(...units.map((unit) => parseInt(unit, 16)));
    });
  return signs;
}
