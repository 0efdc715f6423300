import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

/**
 * Each file shows the cause it names: its mean and variance lie within five standard errors of what the cause
 * implies. The formulas are worked out here by hand, apart from the code that drew the shots.
 */
describe('the counts of', () => {
  it('independent sites: mean 40·0.08 + 24·0.20, variance Σp(1−p)', () => {
    agree(read('independent-sites'), 8, 40 * 0.08 * 0.92 + 24 * 0.2 * 0.8);
  });

  it('bunched sites: variance (1 + 63·0.01) times the ceiling', () => {
    // Two sites of a shot are correlated by ρ: Var = N p(1−p)(1 + (N−1)ρ). Counts of a beta-binomial are
    // heavier in the tails than normal ones, so the error of the variance is taken from the data.
    agree(read('bunched-sites'), 64 * 0.15, 64 * 0.15 * 0.85 * (1 + 63 * 0.01));
  });

  it('misread kinks: the formulas for flips on an open chain', () => {
    // science.md 7: N = 50, p = 0.05, ε = 0.01; m = 1−2p, u = 1−2ε.
    const [n, p, e] = [50, 0.05, 0.01];
    const m2 = (1 - 2 * p) ** 2;
    const u2 = (1 - 2 * e) ** 2;
    const variance = (n * (1 - m2 * u2 * u2) + 2 * (n - 1) * m2 * u2 * (1 - u2)) / 4;
    agree(read('misread-kinks'), n * (p + 2 * e * (1 - e) * (1 - 2 * p)), variance);
  });

  it('a drifting day: mean 10, the last batch above the first', () => {
    const rows = lines('drifting-shots').map((line) => line.split(',').map(Number));
    expect(rows.map(([shot]) => shot)).toEqual(rows.map((_, i) => i + 1));
    const batch = (name: number) => expand(rows.filter((row) => row[1] === name).map((row) => [row[2], 1]));
    agree(batch(1), 8, 100 * 0.08 * 0.92);
    agree(batch(10), 12, 100 * 0.12 * 0.88);
  });

  it('dead shots: 3 % of the shots are empty for nothing', () => {
    const mean = 0.97 * 4.8;
    // Mixture of 0 and Bin(40, 0.12): variance w·σ² + w(1−w)μ².
    agree(read('dead-shots'), mean, 0.97 * 40 * 0.12 * 0.88 + 0.97 * 0.03 * 4.8 ** 2);
  });

  it('kinks on a ring: even, twice independent modes', () => {
    const kinks = read('ring-kinks');
    expect(kinks.every((count) => count % 2 === 0)).toBe(true);
    const [mean, variance] = modes(40, 2);
    agree(
      kinks.map((count) => count / 2),
      mean,
      variance
    );
  });

  it('neighbours that exclude each other: mean 5.680650, variance 1.887740', () => {
    // science.md 11, hard-core gas on 20 sites at fugacity 1 (recomputed there with mpmath).
    agree(read('hard-core-gas'), 5.68065, 1.88774);
  });

  it('forty shots: forty of them', () => {
    expect(lines('forty-shots').length).toBe(40);
  });

  it.each([1, 2, 4, 8, 16, 32])('a quench sweep at %i µs: Landau–Zener modes', (time) => {
    const rows = lines('quench-sweep').map((line) => line.split(','));
    const pairs = expand(rows.filter((row) => row[1] === String(time)).map((row) => [+row[2] / 2, +row[3]]));
    expect(pairs.length).toBe(2000);
    const [mean, variance] = modes(200, time);
    agree(pairs, mean, variance);
  });

  it.each([
    ['ebb 3.1', 0],
    ['ebb 3.2', 0],
    ['ebb 3.3', 0.15],
    ['ebb 3.4', 0]
  ])('firmware %s: neighbours correlated by %f', (version, c) => {
    const rows = lines('firmware-versions').map((line) => line.split(','));
    const counts = expand(rows.filter((row) => row[1] === version).map((row) => [+row[2], +row[3]]));
    expect(counts.length).toBe(4000);
    // Sites i and j are correlated by c^|i−j|.
    let sum = 48;
    for (let distance = 1; distance < 48; distance++) sum += 2 * (48 - distance) * c ** distance;
    agree(counts, 4.8, 0.1 * 0.9 * sum);
  });
});

/** Mean and variance of the number of pairs: Σp and Σp(1−p), p_j = exp(−a k_j²), k_j = (2j−1)π/L. */
function modes(sites: number, a: number): [number, number] {
  let mean = 0;
  let variance = 0;
  for (let j = 1; j <= sites / 2; j++) {
    const p = Math.exp(-a * (((2 * j - 1) * Math.PI) / sites) ** 2);
    mean += p;
    variance += p * (1 - p);
  }
  return [mean, variance];
}

function agree(counts: number[], mean: number, variance: number): void {
  const size = counts.length;
  const m = counts.reduce((sum, count) => sum + count, 0) / size;
  const moment = (r: number) => counts.reduce((sum, count) => sum + (count - m) ** r, 0) / size;
  const errorOfVariance = Math.sqrt((moment(4) - moment(2) ** 2) / size);
  expect(Math.abs(m - mean)).toBeLessThan(5 * Math.sqrt(variance / size));
  expect(Math.abs(moment(2) - variance)).toBeLessThan(5 * errorOfVariance);
}

/** Rows of a file without remarks and header. */
function lines(slug: string): string[] {
  const rows = readFileSync(`fixtures/demo/${slug}.csv`, 'utf8').trim().split('\n');
  return rows.filter((line) => !line.startsWith('#')).slice(1);
}

/** One count a shot of a two-column histogram. */
function read(slug: string): number[] {
  return expand(lines(slug).map((line) => line.split(',').map(Number)));
}

function expand(rows: number[][]): number[] {
  return rows.flatMap(([count, shots]) => new Array<number>(shots).fill(count));
}
