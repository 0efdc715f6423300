import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { readSites } from '$lib/formats/sites/read-sites';
import { oneCrosstalkingPair } from '$lib/stats/demo/one-crosstalking-pair';
import { generator } from '$lib/stats/random/generator';
import { sitesReport } from '$lib/stats/sites/sites-report';
import type { SitesOptions } from '$lib/stats/sites/sites-types';
import { BadInput } from '$lib/stats/types';

const rise: SitesOptions = { geometry: 'chain', alpha: 0.05, seek: 'rise' };

function read(text: string) {
  const reading = readSites(text);
  if (!reading.ok) throw new Error(reading.problems[0].message);
  return { names: reading.sites, shots: reading.shots };
}

/** Shots of independent sites; the rate of shot s is `rate(s)`. */
function draw(seed: number, sites: number, shots: number, rate: (shot: number) => number) {
  const random = generator(seed, 0);
  const names = Array.from({ length: sites }, (_, i) => String(i + 1));
  return {
    names,
    shots: Array.from({ length: shots }, (_, shot) => {
      const row = new Uint8Array(Math.ceil(sites / 8));
      for (let site = 0; site < sites; site++)
        if (random.next() < rate(shot)) row[site >> 3] |= 1 << (site & 7);
      return row;
    })
  };
}

/** Every number of a document is finite. */
function numbers(value: unknown): number[] {
  if (typeof value === 'number') return [value];
  if (value === null || typeof value !== 'object') return [];
  return Object.values(value).flatMap(numbers);
}

describe('64 sites, 5000 shots, one crosstalking pair of correlation 0.05', () => {
  const text = oneCrosstalkingPair();
  const map = sitesReport(read(text), rise);

  it('are the committed file', () => {
    expect(readFileSync('fixtures/sites/one-pair.txt', 'utf8') === text).toBe(true);
  });

  it('give that pair and no other', () => {
    const found = map.pairs.filter(({ pHolm }) => pHolm <= 0.05);
    expect(found.map(({ first, second }) => [first, second])).toEqual([[20, 21]]);
    // (240·5000 − 1000²)/(1000·4000), by hand.
    expect(found[0].correlation).toBeCloseTo(0.05, 12);
    expect(map.statement).toMatch(/^One pair of .* sites 21 and 22, correlation 0\.050/);
    expect(map.common.shown).toBe(false);
  });

  it('are said to hide it from the counts alone, which a test of their variance bears out', () => {
    expect(map.inCounts).toMatchObject({ correlation: 0.05, visible: false });
    expect(map.because.join(' ')).toContain('The count histogram alone cannot show this pair.');
    // 2·0.05/64 of the variance against 2.49·√(2(1 − 1/64)/5000) of it.
    // 0.1/64 by hand where all rates are equal; those of this file are so but for their errors.
    expect(map.inCounts.excess).toBeGreaterThan(0.001);
    expect(map.inCounts.excess).toBeLessThan(0.0017);
    expect(map.inCounts.smallestExcess).toBeCloseTo(2.49 * Math.sqrt((2 * 63) / 64 / 5000), 6);
    const { mean, variance } = map.counts.sites;
    // Within 2.49 standard errors of the ceiling of 64 equal sites: nothing to see.
    expect(Math.abs(variance / (mean * (1 - mean / 64)) - 1)).toBeLessThan(map.inCounts.smallestExcess);
  });

  it('are not said to be safe: the chance to find such a pair stands in the document', () => {
    // 0.5975 and 0.1325 of 2000 simulated pairs at rate 0.2 (pair-power.test.ts), 1.1 and 0.8 % of error.
    expect(Math.abs(map.power.neighbour.power - 0.5975)).toBeLessThan(0.035);
    expect(Math.abs(map.power.distant!.power - 0.1325)).toBeLessThan(0.025);
    expect(map.power.rate).toBeCloseTo(0.2, 2);
    expect(map.cautions.join(' ')).toContain('A pair that is not found may be there.');
  });

  it('give plain JSON without a number that is none, the same bytes again', () => {
    expect(numbers(map).every(Number.isFinite)).toBe(true);
    expect(JSON.stringify(sitesReport(read(text), rise)) === JSON.stringify(map)).toBe(true);
  });
});

describe('a map of sites', () => {
  it('raises the warning of a common cause for drift and not without it', () => {
    let alarms = 0;
    for (let seed = 0; seed < 200; seed++)
      if (
        sitesReport(
          draw(seed, 16, 500, () => 0.15),
          rise
        ).common.shown
      )
        alarms += 1;
    // At 1 % more than 7 of 200 come with a chance of 0.1 % (binomial tail).
    expect(alarms).toBeLessThanOrEqual(7);
    const drift = sitesReport(
      draw(1, 32, 4000, (shot) => 0.1 + (0.15 * shot) / 4000),
      rise
    );
    expect(drift.common.shown).toBe(true);
    expect(drift.cautions[0]).toContain('a common cause, such as drifting rates or dead shots');
  });

  it('raises a false alarm in at most 5 % of maps where a rise is sought', () => {
    let alarms = 0;
    for (let seed = 0; seed < 200; seed++)
      if (
        sitesReport(
          draw(500 + seed, 16, 500, () => 0.15),
          rise
        ).pairs.some(({ pHolm }) => pHolm <= 0.05)
      )
        alarms += 1;
    // At 5 % more than 20 of 200 come with a chance of 0.1 % (binomial tail).
    expect(alarms).toBeLessThanOrEqual(20);
  });

  it('keeps the mean correlation at each distance inside its interval nineteen times in twenty', () => {
    let inside = 0;
    let all = 0;
    for (let seed = 0; seed < 60; seed++)
      for (const { low, high } of sitesReport(
        draw(900 + seed, 12, 640, () => 0.2),
        rise
      ).byDistance) {
        all += 1;
        if (low! <= 0 && high! >= 0) inside += 1;
      }
    // 660 intervals, a spread of 0.85 % about 95 %.
    expect(inside / all).toBeGreaterThan(0.92);
    expect(inside / all).toBeLessThan(0.98);
  });

  it('refuses one site, one shot, a ring of two and too many sites', () => {
    const one = draw(1, 2, 1, () => 0.5);
    expect(() => sitesReport(one, rise)).toThrow(BadInput);
    expect(() =>
      sitesReport(
        draw(1, 2, 9, () => 0.5),
        { ...rise, geometry: 'ring' }
      )
    ).toThrow(/three sites/);
    expect(() =>
      sitesReport(
        draw(1, 129, 9, () => 0.5),
        rise
      )
    ).toThrow(/129 sites; a map takes 128/);
  });

  it('of sites that never or always read 1 has no correlations and says nothing of them', () => {
    const map = sitesReport(
      draw(1, 4, 50, (shot) => (shot < 0 ? 1 : 0)),
      rise
    );
    expect(map.pairs.every(({ correlation, p }) => correlation === null && p === 1)).toBe(true);
    expect(map.power.neighbour).toEqual({ power: 0, shots: null });
    expect(numbers(map).every(Number.isFinite)).toBe(true);
  });
});
