import { describe, expect, it } from 'vitest';
import type { StoryId } from '$lib/stats/explanations/types';
import { dense, momentsOf, storyOf } from '../setting';
import { binomial, chain, losingPairs, misreadChain, polya } from './brute-force';

const mix = (share: number, f: number[], g: number[]) =>
  g.map((value, n) => share * f[n] + (1 - share) * value);

/** Own parameters of each story, and its law by going through every case. */
const cases: [StoryId, number[], (n: number, p: number) => number[]][] = [
  ['common-cause', [0.13], (n, p) => polya(n, p, 0.13)],
  ['common-cause', [0.7], (n, p) => polya(n, p, 0.7)],
  ['neighbours', [0.21], (n, p) => chain(n, p, 0.21)],
  ['neighbours', [0.85], (n, p) => chain(n, p, 0.85)],
  ['two-settings', [0.4], (n, p) => mix(0.5, binomial(n, p * 0.6), binomial(n, p * 1.4))],
  ['bursts', [0.04, 0.5], (n, p) => mix(0.04, binomial(n, p + 0.5 * (1 - p)), binomial(n, p))],
  ['dead-shots', [0.3], (n, p) => mix(0.3, [1, ...new Array<number>(n).fill(0)], binomial(n, p))],
  ['pair-loss', [0.35], (n, p) => losingPairs(n, p, 0.35)],
  ['misread-sites', [0.06], (n, p) => misreadChain(n, p, 0.06)],
  ['misread-sites', [0.3], (n, p) => misreadChain(n, p, 0.3)]
];

describe('the pmf of a story', () => {
  it.each(cases)('%s at %j is what all cases together give, N ≤ 8', (id, own, brute) => {
    for (const trials of id === 'misread-sites' ? [2, 5, 7] : [2, 5, 8]) {
      for (const p of [0.02, 0.3, 0.6]) {
        const found = dense(storyOf(id).window(p, own, trials, trials), trials);
        brute(trials, p).forEach((value, n) => expect(Math.abs(found[n] / value - 1)).toBeLessThan(1e-12));
      }
    }
  });

  it.each([
    ['common-cause', [0]],
    ['neighbours', [0]],
    ['two-settings', [0]],
    ['bursts', [0, 0.3]],
    ['dead-shots', [0]],
    ['pair-loss', [0]],
    ['misread-sites', [0]]
  ] as [StoryId, number[]][])('%s is equal trials at the lower end of its parameter', (id, own) => {
    const law = binomial(30, 0.17);
    const found = dense(storyOf(id).window(0.17, own, 30, 30), 30);
    law.forEach((value, n) => expect(Math.abs(found[n] / value - 1)).toBeLessThan(1e-11));
  });

  it('of a chain read up to a count is the same up to there', () => {
    for (const id of ['neighbours', 'misread-sites'] as const) {
      const whole = dense(storyOf(id).window(0.1, [0.1], 40, 40), 12);
      expect(dense(storyOf(id).window(0.1, [0.1], 40, 12), 12)).toEqual(whole);
    }
  });
});

describe('moments', () => {
  it('of misread kinks: variance 1.239 naive ceilings at N = 50, p = 0.05, ε = 0.01', () => {
    // Closed form: mean N(p + 2ε(1−ε)(1−2p)), variance ¼[N(1 − m²u⁴) + 2(N−1)m²u²(1−u²)], m = 1−2p, u = 1−2ε.
    const [n, p, e] = [50, 0.05, 0.01];
    const [m, u] = [(1 - 2 * p) ** 2, (1 - 2 * e) ** 2];
    const { sum, mean, variance } = momentsOf(dense(storyOf('misread-sites').window(p, [e], n, n), n));
    expect(sum).toBeCloseTo(1, 13);
    expect(mean).toBeCloseTo(n * (p + 2 * e * (1 - e) * (1 - 2 * p)), 11);
    expect(variance).toBeCloseTo((n * (1 - m * u * u) + 2 * (n - 1) * m * u * (1 - u)) / 4, 11);
    // 1.239 was computed apart from this code, with mpmath.
    expect(variance / (mean * (1 - mean / n))).toBeCloseTo(1.239, 3);
  });

  it('of a common cause: 1 + (N − 1)ρ ceilings; with N unknown 1 + θ means', () => {
    const { mean, variance } = momentsOf(dense(storyOf('common-cause').window(0.15, [0.016], 64, 64), 64));
    expect(mean).toBeCloseTo(9.6, 11);
    expect(variance).toBeCloseTo(9.6 * 0.85 * (1 + 63 * 0.016), 10);
    const free = momentsOf(dense(storyOf('common-cause').window(3, [0.8], null, 400), 400));
    expect(free.sum).toBeCloseTo(1, 13);
    expect(free.mean).toBeCloseTo(3, 11);
    expect(free.variance).toBeCloseTo(3 * 1.8, 10);
  });

  it('of a chain: p(1−p)[N + 2Σ(N−d)c^d]', () => {
    const { mean, variance } = momentsOf(dense(storyOf('neighbours').window(0.1, [0.15], 48, 48), 48));
    let pairs = 0;
    for (let d = 1; d < 48; d++) pairs += (48 - d) * 0.15 ** d;
    expect(mean).toBeCloseTo(4.8, 12);
    expect(variance).toBeCloseTo(0.09 * (48 + 2 * pairs), 11);
  });

  it('of the limits for N unknown are those of many rare trials', () => {
    for (const [id, many, few] of [
      ['two-settings', [0.3], [0.3]],
      ['dead-shots', [0.2], [0.2]],
      ['pair-loss', [0.4], [0.4]],
      ['bursts', [0.05, 4 / 1e6], [0.05, 4]]
    ] as [StoryId, number[], number[]][]) {
      const story = storyOf(id);
      const limit = dense(story.window(3, few, null, 30), 30);
      dense(story.window(3e-6, many, 1e6, 30), 30).forEach((value, n) =>
        expect(Math.abs(value / limit[n] - 1)).toBeLessThan(5e-4)
      );
    }
  });
});
