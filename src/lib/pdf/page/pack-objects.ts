import { zlibSync } from 'fflate';
import { joined } from './pack-streams';

/** Objects in one stream: a reader unpacks all of them to get at one. */
const MOST = 200;
const BYTES = { offset: 4, index: 2 } as const;

/**
 * Packs what is not a stream already: the thousands of small objects that tag every cell and line go into object
 * streams, and the table of where everything lies becomes a stream too (ISO 32000-1, 7.5.7 and 7.5.8). A report of two
 * thousand cells comes to half the bytes, and says the same.
 *
 * @param file as pdfkit ends it: one xref table, every object of generation 0
 */
export function packObjects(file: Uint8Array<ArrayBuffer>): Uint8Array<ArrayBuffer> {
  const text = latin(file);
  const table = Number(/startxref\n(\d+)\n%%EOF\s*$/.exec(text)?.[1]);
  const offsets = [...text.slice(table).matchAll(/^(\d{10}) 00000 n/gm)].map(([, offset]) => Number(offset));
  const ends = new Map<number, number>();
  const rising = [...offsets].sort((a, b) => a - b);
  rising.forEach((offset, i) => ends.set(offset, rising[i + 1] ?? table));

  const written: Uint8Array[] = [file.subarray(0, rising[0])];
  let at = rising[0];
  const write = (bytes: Uint8Array): number => {
    written.push(bytes);
    at += bytes.length;
    return at - bytes.length;
  };
  /** Type, place and place within, by number of the object. */
  const places: [type: 0 | 1 | 2, place: number, within: number][] = [[0, 0, 65535]];
  const small: { id: number; body: string }[] = [];
  offsets.forEach((offset, i) => {
    const end = ends.get(offset) ?? table;
    const object = text.slice(offset, end);
    if (object.endsWith('\nendstream\nendobj\n')) places[i + 1] = [1, write(file.subarray(offset, end)), 0];
    else small.push({ id: i + 1, body: object.replace(/^\d+ 0 obj\n/, '').replace(/\nendobj\n$/, '') });
  });
  for (let from = 0; from < small.length; from += MOST) {
    const part = small.slice(from, from + MOST);
    const id = offsets.length + 1 + from / MOST;
    part.forEach((one, index) => (places[one.id] = [2, id, index]));
    places[id] = [1, write(streamOf(id, ...objectStream(part))), 0];
  }
  const id = places.length;
  places[id] = [1, at, 0];
  const trailer = /trailer\n<<\n([\s\S]*?)\n>>\nstartxref/.exec(text)?.[1].replace(/^\/Size \d+$/m, '');
  const keys = `/Type /XRef\n/Size ${places.length}\n/W [1 ${BYTES.offset} ${BYTES.index}]\n${trailer?.trim()}`;
  const start = write(streamOf(id, keys, listed(places)));
  write(bytesOf(`startxref\n${start}\n%%EOF\n`));
  return joined(written);
}

/** Keys and content of a stream of objects: their numbers and places first. */
function objectStream(objects: { id: number; body: string }[]): [keys: string, content: Uint8Array] {
  let place = 0;
  const index = objects.map(({ id, body }) => {
    place += body.length + 1;
    return `${id} ${place - body.length - 1}`;
  });
  const head = `${index.join(' ')}\n`;
  const keys = `/Type /ObjStm\n/N ${objects.length}\n/First ${head.length}`;
  return [keys, bytesOf(head + objects.map(({ body }) => `${body}\n`).join(''))];
}

function streamOf(id: number, keys: string, content: Uint8Array): Uint8Array {
  const packed = zlibSync(content);
  const head = `${id} 0 obj\n<<\n${keys}\n/Length ${packed.length}\n/Filter /FlateDecode\n>>\nstream\n`;
  return joined([bytesOf(head), packed, bytesOf('\nendstream\nendobj\n')]);
}

/** The table of places, each number with its highest byte first. */
function listed(places: [number, number, number][]): Uint8Array {
  const width = 1 + BYTES.offset + BYTES.index;
  const view = new DataView(new ArrayBuffer(places.length * width));
  places.forEach(([type, place, within], i) => {
    view.setUint8(i * width, type);
    view.setUint32(i * width + 1, place);
    view.setUint16(i * width + 1 + BYTES.offset, within);
  });
  return new Uint8Array(view.buffer);
}

/** Bytes as text, a sign a byte. */
function latin(bytes: Uint8Array): string {
  const parts: string[] = [];
  // In pieces: a call takes so many arguments and no more.
  for (let i = 0; i < bytes.length; i += 8192)
    parts.push(String.fromCharCode(...bytes.subarray(i, i + 8192)));
  return parts.join('');
}

function bytesOf(text: string): Uint8Array {
  const bytes = new Uint8Array(text.length);
  for (let i = 0; i < text.length; i++) bytes[i] = text.charCodeAt(i);
  return bytes;
}
