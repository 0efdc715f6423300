import { describe, expect, it } from 'vitest';
import { generator } from '$lib/stats/random/generator';
import { pairTests } from '$lib/stats/sites/pair-tests';

/** Shots of independent sites of one rate; `pair` copies its first site into its second with chance `strength`. */
function draw(
  seed: number,
  sites: number,
  shots: number,
  rate: number,
  pair: [number, number],
  strength: number
) {
  const random = generator(seed, 0);
  return Array.from({ length: shots }, () => {
    const row = new Uint8Array(Math.ceil(sites / 8));
    const read = (site: number) => (row[site >> 3] >> (site & 7)) & 1;
    for (let site = 0; site < sites; site++) {
      const own = random.next() < rate ? 1 : 0;
      const copied = site === pair[1] && random.next() < strength;
      if (copied ? read(pair[0]) : own) row[site >> 3] |= 1 << (site & 7);
    }
    return row;
  });
}

/** Repeats in which any pair but `pair` was found at 5 %, and those in which `pair` was. */
function simulate(repeats: number, rate: number, pair: [number, number], strength: number) {
  let wrong = 0;
  let found = 0;
  let exactly = 0;
  for (let repeat = 0; repeat < repeats; repeat++) {
    const hits = pairTests(draw(700 + repeat, 64, 5000, rate, pair, strength), 64, 'chain').filter(
      (test) => test.pHolm <= 0.05
    );
    const own = hits.filter(({ first, second }) => first === pair[0] && second === pair[1]).length;
    found += own;
    if (own === 1 && hits.length === 1) exactly += 1;
    if (hits.length > own) wrong += 1;
  }
  return { wrong, found, exactly };
}

describe('pairs of sites', () => {
  it('have the covariance and correlation of the plain formulas, on a chain and a ring', () => {
    const shots = draw(5, 11, 77, 0.4, [2, 3], 0.5);
    const columns = Array.from({ length: 11 }, (_, i) => shots.map((row) => (row[i >> 3] >> (i & 7)) & 1));
    const mean = (values: number[]) => values.reduce((x, y) => x + y, 0) / values.length;
    const tests = pairTests(shots, 11, 'ring');
    expect(tests).toHaveLength(55);
    for (const { first, second, covariance, correlation, distance } of tests) {
      const [x, y] = [columns[first], columns[second]];
      const plain = mean(x.map((value, s) => (value - mean(x)) * (y[s] - mean(y))));
      expect(covariance).toBeCloseTo(plain, 12);
      const spread = Math.sqrt(mean(x) * (1 - mean(x)) * mean(y) * (1 - mean(y)));
      expect(correlation).toBeCloseTo(plain / spread, 12);
      expect(distance).toBe(Math.min(second - first, 11 - second + first));
    }
    expect(pairTests(shots, 11, 'chain').at(9)).toMatchObject({ first: 0, second: 10, distance: 10 });
  });

  it('with a site that never reads 1 have no correlation and p = 1', () => {
    const shots = [0b01, 0b01, 0b00].map((bits) => Uint8Array.of(bits));
    expect(pairTests(shots, 2, 'chain')[0]).toMatchObject({
      correlation: null,
      p: 1,
      pHolm: 1,
      pFalseShare: 1
    });
  });

  it('raise a false alarm in at most 5 % of maps, and find a correlation of 0.05 as often as formulas say', () => {
    const repeats = 60;
    // Of 60 maps at 5 %, more than 8 would be wrong with a chance of 0.3 % (binomial tail).
    expect(simulate(repeats, 0.1, [20, 21], 0).wrong).toBeLessThanOrEqual(8);
    // Normal formula: 0.05·√5000 = 3.54 against z(0.025/63 two-sided) = 3.54 for neighbours and z(0.025/1953) = 4.36
    // for other pairs: power 0.50 and 0.20. Limits below are 3.2 standard errors of 60 repeats away.
    const near = simulate(repeats, 0.5, [20, 21], 0.05);
    expect(near.found / repeats).toBeGreaterThan(0.29);
    expect(near.found / repeats).toBeLessThan(0.71);
    expect(near.wrong).toBeLessThanOrEqual(8);
    const far = simulate(repeats, 0.5, [10, 50], 0.05).found / repeats;
    expect(far).toBeGreaterThan(0.03);
    expect(far).toBeLessThan(0.37);
  }, 60_000);
});
