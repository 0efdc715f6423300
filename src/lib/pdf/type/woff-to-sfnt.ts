import { unzlibSync } from 'fflate';

/** Unpacks a zlib stream that is known to come out `length` bytes long. */
export type Unpack = (packed: Uint8Array, length: number) => Uint8Array;

const unpackAnywhere: Unpack = (packed, length) => unzlibSync(packed, { out: new Uint8Array(length) });

const HEADER = 44;
const ENTRY = 20;

/**
 * A TrueType file out of a WOFF one (W3C WOFF 1.0). The font reader would unpack a WOFF's tables bit by bit, and
 * for each document again: half a second a report.
 *
 * @param unpack what a platform has of its own may be quicker; the bytes that come out are the same
 * @throws Error on anything that is not WOFF
 */
export function woffToSfnt(woff: Uint8Array, unpack = unpackAnywhere): Uint8Array {
  const view = new DataView(woff.buffer, woff.byteOffset, woff.byteLength);
  if (woff.length < HEADER || view.getUint32(0) !== 0x774f4646) throw new Error('Not a WOFF file.');
  const count = view.getUint16(12);
  const tables = Array.from({ length: count }, (_, i) => {
    const entry = HEADER + i * ENTRY;
    const [offset, packed, length] = [4, 8, 12].map((shift) => view.getUint32(entry + shift));
    const raw = woff.subarray(offset, offset + packed);
    const data = packed < length ? unpack(raw, length) : raw;
    return { entry, data };
  });
  const head = 12 + 16 * count;
  const padded = (length: number): number => Math.ceil(length / 4) * 4;
  const font = new Uint8Array(tables.reduce((sum, { data }) => sum + padded(data.length), head));
  const out = new DataView(font.buffer);
  const power = Math.floor(Math.log2(count));
  out.setUint32(0, view.getUint32(4));
  out.setUint16(4, count);
  out.setUint16(6, 16 * 2 ** power);
  out.setUint16(8, power);
  out.setUint16(10, 16 * (count - 2 ** power));
  let at = head;
  tables.forEach(({ entry, data }, i) => {
    const to = 12 + 16 * i;
    font.set(woff.subarray(entry, entry + 4), to);
    out.setUint32(to + 4, view.getUint32(entry + 16));
    out.setUint32(to + 8, at);
    out.setUint32(to + 12, data.length);
    font.set(data, at);
    at += padded(data.length);
  });
  return font;
}
