import { siteChangePicture } from '$lib/charts/site-change-picture';
import { siteChangeTable } from '$lib/charts/site-change-table';
import { siteDistancePicture } from '$lib/charts/site-distance-picture';
import { siteMapKinds } from '$lib/charts/site-map-kinds';
import { siteMapPicture } from '$lib/charts/site-map-picture';
import { siteMapTable } from '$lib/charts/site-map-table';
import { siteDistanceTitle, siteMapTitle } from '$lib/charts/site-map-titles';
import { readSites } from '$lib/formats/sites/read-sites';
import { oneCrosstalkingPair } from '$lib/stats/demo/one-crosstalking-pair';
import { generator } from '$lib/stats/random/generator';
import { mapsCompared } from '$lib/stats/sites/maps-compared';
import { sitesReport } from '$lib/stats/sites/sites-report';
import type { SitesOptions, SitesReport } from '$lib/stats/sites/sites-types';
import { describe, expect, it } from 'vitest';
import { faults } from './faults';

/** Invented shots: each site is excited with the rate of its shot. */
function mapOf(
  sites: number,
  shots: number,
  rate: (shot: number) => number,
  more: Partial<SitesOptions> = {}
) {
  const random = generator(5, sites);
  const rows = Array.from({ length: shots }, (_, shot) => {
    const row = new Uint8Array(Math.ceil(sites / 8));
    for (let site = 0; site < sites; site++)
      if (random.next() < rate(shot)) row[site >> 3] |= 1 << (site & 7);
    return row;
  });
  const names = Array.from({ length: sites }, (_, i) => `${i + 1}`);
  return sitesReport({ names, shots: rows }, { geometry: 'chain', alpha: 0.05, seek: 'any', ...more });
}

const drifting = (sites: number): SitesReport => mapOf(sites, 600, (shot) => 0.1 + shot / 1000);

function invented(): SitesReport {
  const read = readSites(oneCrosstalkingPair());
  if (!read.ok) throw new Error('unreadable');
  return sitesReport(
    { names: read.sites, shots: read.shots },
    { geometry: 'chain', alpha: 0.05, seek: 'rise' }
  );
}

describe('every chart', () => {
  it.each<[string, () => SitesReport]>([
    ['two sites', () => mapOf(2, 40, () => 0.5)],
    ['three sites of a ring', () => mapOf(3, 90, () => 0.3, { geometry: 'ring' })],
    ['nine sites of a ring', () => mapOf(9, 400, () => 0.3, { geometry: 'ring' })],
    ['sites that never change', () => mapOf(5, 20, () => 0)],
    ['128 sites of rare excitations', () => mapOf(128, 60, () => 0.02)],
    ['64 drifting sites', () => drifting(64)],
    ['the invented pair', invented]
  ])('of a map of %s is finite and inside its frame', (_name, make) => {
    const map = make();
    for (const width of [260, 342, 760, 1400])
      for (const draw of [siteMapPicture, siteDistancePicture])
        expect(faults(draw(map, { width, text: 13 })), `${width}`).toEqual([]);
    expect(siteMapTable(map).rows).toHaveLength(map.pairs.length);
  });
});

describe('a map of sites', () => {
  it('marks the one pair that was found as a rise over its place, and all else as no finding', () => {
    const map = invented();
    const found = siteMapKinds(map).kinds.filter(({ kind }) => kind !== 'above' && kind !== 'below');
    expect(found).toMatchObject([{ kind: 'risen', pair: { first: 20, second: 21 } }]);
    const picture = siteMapPicture(map, { width: 760, text: 13 });
    expect(
      picture.marks.filter((mark) => mark.kind === 'path' && mark.role === 'observed-more')
    ).toHaveLength(1);
    expect(picture.readings.map(({ words }) => words())).toContainEqual(
      expect.stringMatching(/^Sites 21 and 22, neighbours: correlation 0\.050, .* found among all pairs/)
    );
    expect(siteMapTitle(map)).toBe(
      'One pair of 2\u202f016 stands out from chance: sites 21 and 22, neighbours'
    );
    // Sorted by what is likeliest no chance.
    expect(siteMapTable(map).rows[0].slice(0, 2)).toEqual(['21', '22']);
  });

  it('calls no pair found by itself where all sites move together', () => {
    const map = drifting(24);
    expect(map.common.shown).toBe(true);
    const kinds = new Set(siteMapKinds(map).kinds.map(({ kind }) => kind));
    expect(kinds.has('unread')).toBe(true);
    expect(kinds.has('risen')).toBe(false);
    expect(siteMapTitle(map)).toBe('All sites move together: no pair can be read by itself');
    expect(siteDistanceTitle(map)).toMatch(/leaves 0 at .* neighbours among them/);
  });

  it('places a pair of a ring on its shorter way', () => {
    // Sites 1 and 9 of nine are neighbours; their middle is 9.5, which is 0.5.
    const map = mapOf(9, 400, () => 0.3, { geometry: 'ring' });
    const pair = map.pairs.find(({ first, second }) => first === 0 && second === 8)!;
    Object.assign(pair, { pHolm: 0.001, correlation: 0.2, low: 0.1, high: 0.3 });
    const { readings } = siteMapPicture(map, { width: 760, text: 13 });
    const at = readings.find(({ words }) => words().startsWith('Sites 1 and 9'))!;
    expect(at.x).toBeCloseTo(3.2 * 13, 6);
  });
});

describe('a comparison of two maps', () => {
  it.each<[string, () => SitesReport, () => SitesReport]>([
    ['two sites', () => mapOf(2, 40, () => 0.5), () => mapOf(2, 90, () => 0.2)],
    [
      'a ring',
      () => mapOf(9, 400, () => 0.3, { geometry: 'ring' }),
      () => mapOf(9, 100, () => 0.3, { geometry: 'ring' })
    ],
    ['sites that never change', () => mapOf(5, 20, () => 0), () => mapOf(5, 20, () => 0.5)],
    ['drifting sites', () => drifting(24), () => mapOf(24, 600, () => 0.3)]
  ])('of %s is finite and inside its frame', (_name, before, after) => {
    const compared = mapsCompared(before(), after());
    for (const width of [260, 342, 760, 1400])
      expect(faults(siteChangePicture(compared, { width, text: 13 })), `${width}`).toEqual([]);
    expect(siteChangeTable(compared).rows).toHaveLength(compared.pairs.length);
  });
});
