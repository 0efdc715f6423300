import { inflateSync } from 'node:zlib';

const HEADER = 44;
const ENTRY = 20;

/**
 * Unpacks a WOFF file (W3C recommendation of 2012) to the TrueType file inside. pdfkit reads WOFF too, but inflates
 * in JavaScript, for each document again: half a second a report.
 *
 * @throws Error on anything that is not WOFF
 */
export function woffToSfnt(woff: Buffer): Buffer {
  if (woff.toString('latin1', 0, 4) !== 'wOFF') throw new Error('Not a WOFF file.');
  const count = woff.readUInt16BE(12);
  const tables = Array.from({ length: count }, (_, i) => {
    const at = HEADER + i * ENTRY;
    const [offset, packed, length] = [4, 8, 12].map((shift) => woff.readUInt32BE(at + shift));
    const raw = woff.subarray(offset, offset + packed);
    const data = packed < length ? inflateSync(raw) : raw;
    return { tag: woff.subarray(at, at + 4), checksum: woff.readUInt32BE(at + 16), data };
  });
  const head = Buffer.alloc(12 + 16 * count);
  const power = Math.floor(Math.log2(count));
  head.writeUInt32BE(woff.readUInt32BE(4), 0);
  head.writeUInt16BE(count, 4);
  head.writeUInt16BE(16 * 2 ** power, 6);
  head.writeUInt16BE(power, 8);
  head.writeUInt16BE(16 * (count - 2 ** power), 10);
  const parts: Buffer[] = [head];
  let at = head.length;
  tables.forEach(({ tag, checksum, data }, i) => {
    const entry = 12 + 16 * i;
    tag.copy(head, entry);
    head.writeUInt32BE(checksum, entry + 4);
    head.writeUInt32BE(at, entry + 8);
    head.writeUInt32BE(data.length, entry + 12);
    const padded = Buffer.alloc(Math.ceil(data.length / 4) * 4);
    data.copy(padded);
    parts.push(padded);
    at += padded.length;
  });
  return Buffer.concat(parts);
}
