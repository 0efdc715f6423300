import { woffToSfnt } from '$lib/pdf/type/woff-to-sfnt';
import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { inflateSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';

const file = (path: string): Buffer => readFileSync(createRequire(import.meta.url).resolve(path));

describe('woffToSfnt', () => {
  // The WOFF recommendation keeps the checksums of the TrueType tables: they tell whether each came out whole.
  it.each([
    '@fontsource/atkinson-hyperlegible/files/atkinson-hyperlegible-latin-400-normal.woff',
    '@fontsource/dejavu-sans/files/dejavu-sans-latin-400-normal.woff'
  ])('unpacks every table of %s whole', (path) => {
    const font = Buffer.from(woffToSfnt(file(path)));
    expect(font.readUInt32BE(0)).toBe(0x00010000);
    const count = font.readUInt16BE(4);
    const tags: string[] = [];
    for (let i = 0; i < count; i++) {
      const at = 12 + 16 * i;
      const tag = font.toString('latin1', at, at + 4);
      const [checksum, offset, length] = [4, 8, 12].map((shift) => font.readUInt32BE(at + shift));
      expect(offset % 4).toBe(0);
      let sum = 0;
      // OpenType: the sum of big-endian words modulo 2^32; that of `head` leaves out its adjustment.
      for (let word = 0; word < length; word += 4)
        if (tag !== 'head' || word !== 8) sum = (sum + font.readUInt32BE(offset + word)) % 2 ** 32;
      expect(sum, tag).toBe(checksum);
      tags.push(tag);
    }
    for (const tag of ['cmap', 'glyf', 'head', 'hmtx', 'loca', 'maxp']) expect(tags).toContain(tag);
  });

  it('gives the same bytes by Node’s own zlib', () => {
    const woff = file('@fontsource/dejavu-sans/files/dejavu-sans-latin-400-normal.woff');
    const own = woffToSfnt(woff, (packed) => inflateSync(packed));
    expect(Buffer.compare(own, woffToSfnt(woff))).toBe(0);
  });

  it('refuses anything else', () => {
    expect(() => woffToSfnt(Buffer.from('wOF2 and more'))).toThrow('Not a WOFF file.');
  });
});
