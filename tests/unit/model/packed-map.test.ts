import { packDocument } from '$lib/model/packed-document';
import { packMap, unpackMap } from '$lib/model/packed-map';
import { sitesReport } from '$lib/stats/sites/sites-report';
import { describe, expect, it } from 'vitest';

/** Invented: the binary digits of the shot's square, and a last site that never reads 1. */
const mapOf = (sites: number) =>
  sitesReport(
    {
      names: Array.from({ length: sites }, (_, i) => `${i + 1}`),
      shots: Array.from({ length: 60 }, (_, s) => Uint8Array.of(s * s, (s * s) >> 3, (s * s) >> 7, 0))
    },
    { geometry: 'chain', alpha: 0.05, seek: 'any' }
  );

describe('packMap', () => {
  it('gives the same map again to the last digit, nulls too, through JSON, in less room', () => {
    const map = mapOf(32);
    const packed = packMap(map);
    if (!packed) throw new Error('not packed');
    const sent = JSON.stringify(packed);
    expect(JSON.stringify(unpackMap(JSON.parse(sent) as typeof packed))).toBe(JSON.stringify(map));
    expect(map.pairs.some(({ correlation }) => correlation === null)).toBe(true);
    expect(sent.length).toBeLessThan(0.8 * JSON.stringify(map).length);
  });

  it('leaves small maps, packed ones and everything else alone', () => {
    for (const value of [mapOf(4), packMap(mapOf(32)), null, 7, 'x', [], { format: 'severalty.sites/1' }])
      expect(packMap(value)).toBe(false);
    expect(packDocument(mapOf(32))).toBe(false);
  });
});
