import { describe, expect, it } from 'vitest';
import { siteCounts } from '$lib/stats/sites/site-counts';

/** Every shot of n sites, as a string of bits and packed. */
function everyShot(n: number) {
  return Array.from({ length: 2 ** n }, (_, value) => {
    const row = new Uint8Array(Math.ceil(n / 8));
    for (let i = 0; i < n; i++) if ((value >> i) & 1) row[i >> 3] |= 1 << (i & 7);
    return { text: Array.from({ length: n }, (_, i) => (value >> i) & 1).join(''), row };
  });
}

/** Changes of value along a text, found by taking it apart into runs. */
const changes = (text: string) => text.match(/0+|1+/g)!.length - 1;

describe('counts from sites', () => {
  it.each([3, 8, 9, 11])('agree with every shot of %d sites written out', (n) => {
    const all = everyShot(n);
    const rows = all.map(({ row }) => row);
    const texts = all.map(({ text }) => text);
    const counted = (geometry: Parameters<typeof siteCounts>[2]) =>
      Array.from(siteCounts(rows, n, geometry).shots);
    expect(counted('sites')).toEqual(texts.map((text) => text.replaceAll('0', '').length));
    expect(counted('open-bonds')).toEqual(texts.map(changes));
    expect(counted('ring-bonds')).toEqual(texts.map((text) => changes(text + text[0])));
    expect(counted('ring-bonds').every((count) => count % 2 === 0)).toBe(true);
    expect(Math.max(...counted('open-bonds'))).toBe(n - 1);
  });

  it('keep the order of the shots', () => {
    const rows = [0b101, 0b111, 0b000].map((bits) => Uint8Array.of(bits));
    expect(siteCounts(rows, 3, 'sites')).toEqual({
      kind: 'shots',
      shots: Uint32Array.of(2, 3, 0),
      batches: null
    });
  });

  it('are refused for one site, and for a ring of two', () => {
    expect(() => siteCounts([], 1, 'sites')).toThrow(RangeError);
    expect(() => siteCounts([], 2, 'ring-bonds')).toThrow(RangeError);
  });
});
