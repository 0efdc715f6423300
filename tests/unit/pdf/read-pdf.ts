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
 * Reads the text of a PDF. Written for these tests: it knows what pdfkit writes (fonts with ToUnicode,
 * hexadecimal strings), packed or not, and nothing else.
 */
export function readPdf(bytes: Uint8Array): ReadPdf {
  const objects = objectsOf(Buffer.from(bytes).toString('latin1'));
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

/** Every object by its number, whether it has a place of its own or lies with others in a stream (7.5.7). */
function objectsOf(file: string): Map<number, string> {
  const places = placesOf(file);
  const starts = [...places.values(), Number(file.match(/startxref\n(\d+)\n%%EOF/)?.[1])];
  const ends = starts.sort((a, b) => a - b);
  const objects = new Map<number, string>();
  for (const [id, offset] of places) {
    const end = ends.find((other) => other > offset);
    const object = unpacked(file.slice(offset, end).replace(/^\d+ 0 obj\n/, ''));
    if (!/\/Type \/ObjStm\b/.test(object)) {
      if (!/\/Type \/XRef\b/.test(object)) objects.set(id, object);
      continue;
    }
    const content = object.slice(object.indexOf('stream\n') + 7).replace(/\nendstream$/, '');
    const first = Number(object.match(/\/First (\d+)/)?.[1]);
    const index = content.slice(0, first).trim().split(/\s+/).map(Number);
    for (let i = 0; i < index.length; i += 2)
      objects.set(
        index[i],
        `${content.slice(first + index[i + 1], first + (index[i + 3] ?? Infinity))}endobj\n`
      );
  }
  return new Map([...objects].sort(([a], [b]) => a - b));
}

/** Where the objects lie that have a place of their own: from the table at the end, or from the stream in its stead. */
function placesOf(file: string): Map<number, number> {
  const at = Number(file.match(/startxref\n(\d+)\n%%EOF/)?.[1]);
  const end = file.slice(at);
  if (end.startsWith('xref'))
    return new Map([...end.matchAll(/^(\d{10}) \d{5} n/gm)].map(([, place], i) => [i + 1, Number(place)]));
  const stream = unpacked(end.replace(/^\d+ 0 obj\n/, ''));
  const rows = Buffer.from(
    stream.slice(stream.indexOf('stream\n') + 7).replace(/\nendstream$/, ''),
    'latin1'
  );
  const [type, place, within] = (stream.match(/\/W \[(\d+) (\d+) (\d+)\]/) ?? []).slice(1).map(Number);
  const width = type + place + within;
  const found = new Map<number, number>();
  for (let id = 0; id * width < rows.length; id++)
    if (rows.readUIntBE(id * width, type) === 1) found.set(id, rows.readUIntBE(id * width + type, place));
  return found;
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
