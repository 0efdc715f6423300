import { deflateRawSync } from 'node:zlib';

/** One entry as the directory of a zip claims it to be, which need not be what stands there. */
export interface Claim {
  name: string | Uint8Array;
  /** Where its local header is; several may claim one place. */
  at: number;
  /** Bytes that it says to take in the file, and to have unpacked. */
  packed: number;
  unpacked: number;
  /** 0 stored, 8 deflated; anything else is no method of ours. */
  method?: number;
}

/** A local header (APPNOTE 4.3.7, without its sum, which nobody here reads) and its bytes behind it. */
export function localFile(name: string, bytes: Uint8Array, method: 0 | 8 = 0): Buffer {
  const path = Buffer.from(name);
  const body = method === 8 ? deflateRawSync(bytes, { level: 9 }) : Buffer.from(bytes);
  const head = Buffer.alloc(30);
  head.writeUInt32LE(0x04034b50, 0);
  head.writeUInt16LE(20, 4);
  head.writeUInt16LE(method, 8);
  head.writeUInt32LE(body.length, 18);
  head.writeUInt32LE(bytes.length, 22);
  head.writeUInt16LE(path.length, 26);
  return Buffer.concat([head, path, body]);
}

/** A zip whose directory claims whatever it is told to (APPNOTE 4.3.12, 4.3.16). No library writes such files. */
export function zipOfClaims(
  body: Uint8Array,
  claims: Claim[],
  { entries = claims.length, directoryAt = body.length } = {}
): Uint8Array {
  const directory = claims.map(({ name, at, packed, unpacked, method = 0 }) => {
    const path = Buffer.from(name);
    const head = Buffer.alloc(46);
    head.writeUInt32LE(0x02014b50, 0);
    head.writeUInt16LE(20, 4);
    head.writeUInt16LE(20, 6);
    head.writeUInt16LE(0x800, 8);
    head.writeUInt16LE(method, 10);
    head.writeUInt32LE(packed, 20);
    head.writeUInt32LE(unpacked, 24);
    head.writeUInt16LE(path.length, 28);
    head.writeUInt32LE(at, 42);
    return Buffer.concat([head, path]);
  });
  const listed = Buffer.concat(directory);
  const end = Buffer.alloc(22);
  end.writeUInt32LE(0x06054b50, 0);
  end.writeUInt16LE(entries & 0xffff, 8);
  end.writeUInt16LE(entries & 0xffff, 10);
  end.writeUInt32LE(listed.length, 12);
  end.writeUInt32LE(directoryAt, 16);
  return new Uint8Array(Buffer.concat([body, listed, end]));
}
