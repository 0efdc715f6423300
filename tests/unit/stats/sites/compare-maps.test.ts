import { generator } from '$lib/stats/random/generator';
import { compareMaps } from '$lib/stats/sites/compare-maps';
import { sitesReport } from '$lib/stats/sites/sites-report';
import type { SitesOptions } from '$lib/stats/sites/sites-types';
import { BadInput } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Invented: sites of one rate; the second copies the first with a chance, which is then about their correlation. */
function mapOf(
  run: number,
  sites: number,
  shots: number,
  rate: number,
  copies = 0,
  more: Partial<SitesOptions> = {}
) {
  const random = generator(81, run);
  const rows = Array.from({ length: shots }, () => {
    const row = new Uint8Array(Math.ceil(sites / 8));
    for (let site = 0; site < sites; site++) {
      const copied = site === 1 && random.next() < copies;
      if (copied ? row[0] & 1 : random.next() < rate) row[site >> 3] |= 1 << (site & 7);
    }
    return row;
  });
  const names = Array.from({ length: sites }, (_, i) => `${i + 1}`);
  return sitesReport({ names, shots: rows }, { geometry: 'chain', alpha: 0.05, seek: 'any', ...more });
}

describe('two maps of the same sites', () => {
  it('keep the chance of any false alarm, though rates changed between them', () => {
    const runs = 200;
    let alarms = 0;
    for (let run = 0; run < runs; run++) {
      const { pairs } = compareMaps(mapOf(2 * run, 8, 400, 0.3), mapOf(2 * run + 1, 8, 300, 0.4));
      if (pairs.some(({ pHolm }) => pHolm <= 0.05)) alarms += 1;
    }
    expect(alarms / runs).toBeLessThan(0.05 + 3 * Math.sqrt((0.05 * 0.95) / runs));
    if (process.env.TELL) console.log('false alarms', alarms / runs);
  });

  it('find the neighbours whose correlation rose by 0.2, and mostly no other', () => {
    const runs = 100;
    let [found, others] = [0, 0];
    for (let run = 0; run < runs; run++) {
      const { pairs } = compareMaps(mapOf(2 * run, 8, 1000, 0.3), mapOf(2 * run + 1, 8, 1000, 0.3, 0.2));
      const shown = pairs.filter(({ pHolm }) => pHolm <= 0.05);
      if (shown.some(({ first, second }) => first === 0 && second === 1)) found += 1;
      others += shown.filter(({ first, second }) => first + second !== 1).length;
    }
    if (process.env.TELL) console.log('found', found / runs, 'others', others / runs);
    expect(found).toBeGreaterThan(80);
    expect(others).toBeLessThan(20);
  });

  it('look for a rise alone only where both declared it, at the stricter level', () => {
    const rise = { seek: 'rise', alpha: 0.01 } as const;
    const [a, b] = [mapOf(1, 4, 60, 0.3, 0, rise), mapOf(2, 4, 60, 0.3)];
    expect(compareMaps(a, b)).toMatchObject({ seek: 'any', alpha: 0.01 });
    expect(compareMaps(a, a)).toMatchObject({ seek: 'rise', alpha: 0.01, common: false });
    for (const { earlier, later, pHolm } of compareMaps(b, b).pairs) {
      expect(later).toBe(earlier);
      expect(pHolm).toBe(1);
    }
  });

  it('are refused where their sites are not the same', () => {
    const map = mapOf(1, 4, 30, 0.3);
    expect(() => compareMaps(map, mapOf(1, 5, 30, 0.3))).toThrow(BadInput);
    expect(() => compareMaps(map, mapOf(1, 4, 30, 0.3, 0, { geometry: 'ring' }))).toThrow(BadInput);
    expect(() => compareMaps(map, { ...map, names: ['1', '2', '4', '3'] })).toThrow(BadInput);
  });
});
