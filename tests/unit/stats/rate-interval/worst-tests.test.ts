import { worstCertificate, worstTests } from '$lib/stats/rate-interval/worst-tests';
import type { AtRate, BareTest } from '$lib/stats/rate-interval/at-rate';
import type { Certificate } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

const test = (id: BareTest['id'], p: number): BareTest => ({
  id,
  statistic: 10 * p,
  p,
  smallestP: 0.001,
  source: 'resampled',
  resamples: Math.round(1 / p),
  stoppedEarly: false
});
const at = (rate: number, tests: BareTest[]): AtRate => ({ rate, tests, ceiling: 5, certificate: null });

describe('worstTests', () => {
  it('takes the largest p of each test over the rates, plus β, and keeps the statistic stated', () => {
    const stated = [test('ceiling', 0.01), test('fit', 0.5)];
    const found = worstTests(
      stated,
      [
        at(0, [test('ceiling', 0.002), test('fit', 0.02)]),
        at(0.02, [test('ceiling', 0.25), test('fit', 0.1)])
      ],
      1e-4
    );
    expect(found.map(({ p }) => p)).toEqual([0.25 + 1e-4, 0.5 + 1e-4]);
    expect(found.map(({ statistic }) => statistic)).toEqual(stated.map(({ statistic }) => statistic));
    // The resamples are those behind the p shown.
    expect(found[0].resamples).toBe(4);
    expect(found[0].smallestP).toBeCloseTo(0.0011, 12);
  });

  it('leaves a test as it is that was not asked at a rate', () => {
    const part: AtRate = { ...at(0.01, [test('fit', 0.03)]), only: ['fit'] };
    const found = worstTests([test('fit', 0.002), test('parity', 0.4)], [part], 1e-4);
    expect(found.map(({ p }) => p)).toEqual([0.03 + 1e-4, 0.4 + 1e-4]);
    // Asked and not run there: it cannot speak against that rate.
    const asked: AtRate = { ...part, only: ['fit', 'parity'] };
    expect(worstTests([test('parity', 0.002)], [asked], 1e-4)[0].p).toBe(1);
  });

  it('never passes 1, and lets a test that cannot run at a rate not speak against it', () => {
    expect(worstTests([test('fit', 1)], [], 0.01)[0].p).toBe(1);
    expect(worstTests([test('fit', 0.001)], [at(0.02, [test('ceiling', 0.2)])], 1e-4)[0].p).toBe(1);
  });
});

describe('worstCertificate', () => {
  const certificate = (p: number): Certificate => ({
    p,
    side: 'high',
    count: 15,
    thresholds: 9,
    bound: 1e-4,
    shots: 9,
    mean: 6
  });

  it('is the weakest, plus β; none where one rate has none', () => {
    expect(worstCertificate([certificate(1e-9), certificate(1e-3)], 1e-4)?.p).toBeCloseTo(0.0011, 12);
    expect(worstCertificate([certificate(1e-9), null], 1e-4)).toBeNull();
    expect(worstCertificate([], 1e-4)).toBeNull();
  });
});
