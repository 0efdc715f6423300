import { inflateRawSync } from 'node:zlib';

/** One file of a zip, as its directory describes it. */
export interface ZipEntry {
  name: string;
  /** Bytes in the zip, and unpacked. */
  size: number;
  originalSize: number;
}

/** A zip that was damaged, or made to mislead; says how. */
export class BadZip extends Error {}

interface Placed extends ZipEntry {
  method: number;
  from: number;
}

const END = 0x06054b50;
const ENTRY = 0x02014b50;
const LOCAL = 0x04034b50;
const STORED = 0;
const DEFLATED = 8;
/** What stands of a header before its names: APPNOTE.TXT 6.3.10, 4.3.16, 4.3.12 and 4.3.7. */
const LENGTHS = { end: 22, entry: 46, local: 30 };
const MOST_COMMENT = 0xffff;
/** Zip's sign that a number stands in the wider form of zip, which no archive of ours has. */
const WIDER = 0xffffffff;

/**
 * The files of a zip. Own reader of the directory, because the library that writes our zips believes it: it copies a
 * stored file by its packed size, whatever was claimed of it, lets thousands of entries lie over the same bytes (1 MB
 * became 300 MB), and goes on inflating past the room that was claimed. Here entries may not overlap, a stored file is
 * as long as it says, and inflating ends (in zlib) at the first byte beyond the claim. So the claims can be judged.
 *
 * @param judge told of every entry, in the order of the directory, before anything is unpacked; throws to refuse
 * @throws BadZip; another error when it is no zip at all
 */
export function readZip(bytes: Uint8Array, judge: (entry: ZipEntry) => void): Map<string, Uint8Array> {
  const entries = directory(bytes, judge);
  const inOrder = [...entries].sort((a, b) => a.from - b.from);
  for (const [i, { name, from, size }] of inOrder.entries())
    if (from + size > (inOrder[i + 1]?.from ?? bytes.length))
      throw new BadZip(`${name} lies over another file of the zip.`);
  return new Map(entries.map((entry) => [entry.name, unpack(bytes, entry)]));
}

function directory(bytes: Uint8Array, judge: (entry: ZipEntry) => void): Placed[] {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const end = endOf(view);
  const count = view.getUint16(end + 10, true);
  const first = view.getUint32(end + 16, true);
  if (view.getUint32(end + 4, true) !== 0 || view.getUint16(end + 8, true) !== count)
    throw new BadZip('It is one part of several.');
  if (first + view.getUint32(end + 12, true) !== end) throw new BadZip('Its directory is not where it says.');
  const list: Placed[] = [];
  let at = first;
  for (let i = 0; i < count; i += 1) {
    if (at + LENGTHS.entry > end || view.getUint32(at, true) !== ENTRY)
      throw new BadZip('Its directory lists fewer files than it says.');
    const [nameLength, extra, comment] = [28, 30, 32].map((place) => view.getUint16(at + place, true));
    const name = textOf(bytes, at + LENGTHS.entry, nameLength);
    const [size, originalSize, local] = [20, 24, 42].map((place) => view.getUint32(at + place, true));
    if ([size, originalSize, local].includes(WIDER)) throw new BadZip('It is of the wider form of zip.');
    judge({ name, size, originalSize });
    const method = view.getUint16(at + 10, true);
    if (method === STORED && size !== originalSize)
      throw new BadZip(`${name} is stored, and not as long as the directory says.`);
    const from = afterLocal(view, bytes, local, name);
    if (from + size > first) throw new BadZip(`${name} lies over the directory.`);
    list.push({ name, size, originalSize, method, from });
    at += LENGTHS.entry + nameLength + extra + comment;
  }
  if (at !== end) throw new BadZip('Its directory lists more files than it says.');
  return list;
}

/** Where the record at the end begins; its comment must reach just to the end, so that there is one such place. */
function endOf(view: DataView): number {
  const lowest = Math.max(0, view.byteLength - LENGTHS.end - MOST_COMMENT);
  for (let at = view.byteLength - LENGTHS.end; at >= lowest; at -= 1) {
    if (view.getUint32(at, true) !== END) continue;
    if (at + LENGTHS.end + view.getUint16(at + 20, true) === view.byteLength) return at;
  }
  throw new Error('no directory');
}

/** Where the bytes of a file begin: behind a header of its own, which must name it as the directory does. */
function afterLocal(view: DataView, bytes: Uint8Array, at: number, name: string): number {
  if (at + LENGTHS.local > view.byteLength || view.getUint32(at, true) !== LOCAL)
    throw new BadZip(`${name} is not where the directory says.`);
  const nameLength = view.getUint16(at + 26, true);
  if (textOf(bytes, at + LENGTHS.local, nameLength) !== name)
    throw new BadZip(`${name} has another name where it stands.`);
  return at + LENGTHS.local + nameLength + view.getUint16(at + 28, true);
}

function unpack(bytes: Uint8Array, { name, method, from, size, originalSize }: Placed): Uint8Array {
  const packed = bytes.subarray(from, from + size);
  if (method === STORED) return packed.slice();
  if (method !== DEFLATED) throw new BadZip(`${name} is packed in a way that no archive of a team is.`);
  let whole: Uint8Array;
  try {
    whole = inflateRawSync(packed, { maxOutputLength: Math.max(1, originalSize) });
  } catch {
    throw new BadZip(`${name} does not unpack to what the directory says.`);
  }
  if (whole.length !== originalSize) throw new BadZip(`${name} does not unpack to what the directory says.`);
  return whole;
}

const textOf = (bytes: Uint8Array, from: number, length: number): string =>
  new TextDecoder('utf-8', { ignoreBOM: true }).decode(bytes.subarray(from, from + length));
