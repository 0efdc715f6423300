import { expect, it } from 'vitest';
import { pairInCounts } from '$lib/stats/sites/pair-in-counts';

const alike = (sites: number, rate: number) => Array.from({ length: sites }, () => rate);

it('says that counts of 64 sites and 5000 shots cannot show one pair of correlation 0.05', () => {
  const asked = { correlation: 0.05, pair: [0.2, 0.2] as [number, number], shots: 5000, found: true };
  const told = pairInCounts({ ...asked, rates: alike(64, 0.2) });
  // By hand: 0.1/64, and 2.49·√(2·(63/64)/5000).
  expect(told.excess).toBeCloseTo(0.0015625, 12);
  expect(told.smallestExcess).toBeCloseTo(0.04941, 5);
  expect(told.visible).toBe(false);
  expect(told.statement).toContain('adds 0.16 % of its ceiling');
  expect(told.statement).toContain('cannot show this pair');
  expect(told.statement).toContain('from about 5\u202f000\u202f000 shots on');
  expect(pairInCounts({ ...asked, rates: alike(64, 0.2), found: false }).statement).toMatch(
    /cannot show such a pair\. Such a pair would/
  );
});

it('says that no number of shots shows a pair whose variance stays under the ceiling of unequal rates', () => {
  // Four sites of 0.1 and four of 0.5: mean 0.3, ceiling 8·0.21 = 1.68; squares 8·0.04 = 0.32, deficit 0.1905.
  const rates = [...alike(4, 0.1), ...alike(4, 0.5)];
  const told = pairInCounts({ correlation: 0.5, pair: [0.1, 0.5], rates, shots: 1e9, found: true });
  // 2·0.5·√(0.09·0.25)/1.68 = 0.0893 less the deficit.
  expect(told.excess).toBeCloseTo(0.15 / 1.68 - 0.32 / 1.68, 6);
  expect(told).toMatchObject({ visible: false, shotsNeeded: null });
  expect(told.statement).toMatch(/no number of shots/);
});

it('says of sites that avoid each other that a smaller variance is no sign of dependence', () => {
  const told = pairInCounts({
    correlation: -0.14,
    pair: [0.3, 0.3],
    rates: alike(8, 0.3),
    shots: 5000,
    found: true
  });
  expect(told).toMatchObject({ visible: false, shotsNeeded: null });
  expect(told.statement).toMatch(/correlation −0\.14 .* no sign of dependence/);
});

it('takes off what the errors of measured rates add', () => {
  // Rates 0.3 ± one standard error of 200 shots, as chance gives them: what is left is 0 and not a deficit.
  const error = Math.sqrt((0.3 * 0.7) / 200);
  const rates = Array.from({ length: 8 }, (_, i) => 0.3 + (i % 2 ? error : -error) * Math.sqrt(7 / 8));
  const told = pairInCounts({ correlation: 0.5, pair: [0.3, 0.3], rates, shots: 200, found: true });
  expect(told.excess).toBeGreaterThan(0.124);
});

it('says that two sites that mostly agree are seen, and refuses one site', () => {
  const asked = { correlation: 0.9, pair: [0.5, 0.5] as [number, number], shots: 5000, found: true };
  expect(pairInCounts({ ...asked, rates: [0.5, 0.5] }).visible).toBe(true);
  expect(() => pairInCounts({ ...asked, rates: [0.5] })).toThrow(RangeError);
  expect(pairInCounts({ ...asked, rates: [0, 0] })).toMatchObject({ visible: false, shotsNeeded: null });
});
