import { readSites } from '$lib/formats/sites/read-sites';
import { oneCrosstalkingPair } from '$lib/stats/demo/one-crosstalking-pair';
import { changePower } from '$lib/stats/sites/change-power';
import { mapsCompared } from '$lib/stats/sites/maps-compared';
import { sitesReport } from '$lib/stats/sites/sites-report';
import type { SitesReport } from '$lib/stats/sites/sites-types';
import { describe, expect, it } from 'vitest';

function invented(together: number, seed: number): SitesReport {
  const read = readSites(oneCrosstalkingPair(together, seed));
  if (!read.ok) throw new Error('unreadable');
  return sitesReport(
    { names: read.sites, shots: read.shots },
    { geometry: 'chain', alpha: 0.05, seek: 'rise' }
  );
}

describe('two maps side by side', () => {
  it('do not call a pair changed because one map found it and the other did not', () => {
    const [before, after] = [invented(200, 2), invented(240, 1)];
    expect(after.statement).toMatch(/^One pair .* sites 21 and 22/);
    const compared = mapsCompared(before, after);
    expect(compared.statement).toMatch(/^No pair of .* changed .* chance of about 25/);
    expect(compared.power.power).toBeCloseTo(0.245, 2);
    expect(compared.power.shots).toBeGreaterThan(10_000);
    expect(compared.cautions.join(' ')).toContain('has not for that alone changed');
  });

  it('name the pair whose correlation rose by 0.15, in words that say before and after', () => {
    const compared = mapsCompared(invented(200, 2), invented(320, 3));
    expect(compared.statement).toBe(
      'One pair of 2\u202f016 changed by more than chance allows: sites 21 and 22, correlation 0 before, 0.15 after.'
    );
    expect(compared.because[0]).toMatch(/neighbours.*Holm/);
    // A fall is not looked for where both maps declared a rise.
    expect(mapsCompared(invented(320, 3), invented(200, 2)).statement).toMatch(/^No pair/);
    expect(JSON.parse(JSON.stringify(compared))).toEqual(compared);
  });

  it('say that pairs cannot be read one by one where all sites move together', () => {
    const before = invented(200, 2);
    const moved = { ...before, common: { ...before.common, shown: true } };
    expect(mapsCompared(before, moved).statement).toMatch(/^All sites of at least one/);
  });

  it('tell a chance near that of simulation', () => {
    // 0.94 of 100 runs in compare-maps.test.ts: 8 sites of rate 0.3, 1000 shots each, a rise of 0.2.
    const asked = {
      sites: 8,
      shots: [1000, 1000] as [number, number],
      geometry: 'chain',
      alpha: 0.05,
      seek: 'any'
    } as const;
    const { power, shots } = changePower(0.2, asked);
    expect(power).toBeGreaterThan(0.9);
    expect(power).toBeLessThan(0.97);
    expect(changePower(0.2, { ...asked, shots: [shots, shots] }).power).toBeCloseTo(0.8, 1);
  });
});
