import { siteDistanceTitle, siteMapTitle } from '$lib/charts/site-map-titles';
import { generator, type Generator } from '$lib/stats/random/generator';
import { pairPower } from '$lib/stats/sites/pair-power';
import { sitesReport } from '$lib/stats/sites/sites-report';
import { describe, expect, it } from 'vitest';

/** Invented shots, each a list of 0 and 1 made by `draw`. */
function mapOf(
  sites: number,
  shots: number,
  draw: (random: Generator, shot: number) => boolean[],
  seed = 91
) {
  const random = generator(seed, sites);
  const rows = Array.from({ length: shots }, (_, shot) => {
    const row = new Uint8Array(Math.ceil(sites / 8));
    draw(random, shot).forEach((on, site) => on && (row[site >> 3] |= 1 << (site & 7)));
    return row;
  });
  const names = Array.from({ length: sites }, (_, i) => `${i + 1}`);
  return sitesReport({ names, shots: rows }, { geometry: 'chain', alpha: 0.05, seek: 'any' });
}

const each = (random: Generator, sites: number, rate: number) =>
  Array.from({ length: sites }, () => random.next() < rate);

describe('a common cause', () => {
  it('is not seen in independent shots that were selected by their total: these avoid each other', () => {
    const map = mapOf(24, 3000, (random) => {
      for (;;) {
        const shot = each(random, 24, 0.2);
        const total = shot.filter(Boolean).length;
        if (total >= 3 && total <= 6) return shot;
      }
    });
    expect(map.common.mean).toBeLessThan(-0.02);
    expect(map.statement).toMatch(/^Sites avoid each other on the whole, .*selected by their total/);
    expect(map.cautions[0]).toMatch(/kept or dropped by how many/);
    expect(map.cautions.join(' ')).not.toMatch(/drift/);
    expect(siteMapTitle(map)).toMatch(/^Sites avoid each other/);
  });

  it('is not seen in a chain of which each site copies its neighbour now and then', () => {
    const map = mapOf(16, 5000, (random) => {
      const shot = each(random, 16, 0.3);
      for (let site = 1; site < 16; site++) if (random.next() < 0.3) shot[site] = shot[site - 1];
      return shot;
    });
    expect(map.common.shown).toBe(false);
    expect(map.statement).toMatch(/ pairs of 120 are correlated/);
  });

  it('is not seen in four disjoint pairs of eight sites', () => {
    const map = mapOf(8, 5000, (random) => {
      const shot = each(random, 8, 0.3);
      for (let site = 1; site < 8; site += 2) if (random.next() < 0.3) shot[site] = shot[site - 1];
      return shot;
    });
    expect(map.common.shown).toBe(false);
    expect(map.statement).toMatch(/^4 pairs of 28/);
  });

  it('is seen where the rate of all sites drifts, on every map of 40', () => {
    let seen = 0;
    for (let run = 0; run < 40; run++) {
      const map = mapOf(12, 1000, (random, shot) => each(random, 12, 0.1 + shot / 2500), 200 + run);
      if (map.common.shown && map.common.mean! > 0) seen += 1;
    }
    expect(seen).toBe(40);
  });

  it('is seen by chance in one map of a hundred where sites are independent', () => {
    const runs = 600;
    let seen = 0;
    for (let run = 0; run < runs; run++)
      if (mapOf(8, 300, (random) => each(random, 8, 0.3), 300 + run).common.shown) seen += 1;
    // Level 1 %: three standard errors of 600 runs.
    expect(seen / runs).toBeLessThan(0.01 + 3 * Math.sqrt((0.01 * 0.99) / runs));
  });
});

describe('small maps', () => {
  it('do not say that one of three distances leaves 0 by chance', () => {
    const one = { distance: 1, pairs: 3, value: 0.1, low: 0.05, high: 0.15 };
    const title = siteDistanceTitle({ byDistance: [one, { ...one, distance: 2 }, { ...one, distance: 3 }] });
    expect(title).toMatch(/fewer than one would by chance alone/);
  });

  it('give all of the error to neighbours where there are no other pairs', () => {
    const asked = { shots: 2000, geometry: 'chain', alpha: 0.05, rate: 0.3 } as const;
    const two = { ...asked, sites: 2 };
    // One pair and one test: neighbours first or not cannot matter.
    expect(pairPower(0.05, { ...two, seek: 'any' }).neighbour.power).toBeCloseTo(
      pairPower(0.05, { ...two, alpha: 0.025, seek: 'rise' }).neighbour.power,
      2
    );
    const map = mapOf(2, 50, (random) => each(random, 2, 0.3));
    expect(map.cautions.join(' ')).not.toMatch(/half of the allowed error/);
  });
});
