import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { poissonWindow } from '$lib/stats/laws/poisson-window';
import type { Window } from '$lib/stats/laws/window';
import { chiSquareTail } from '$lib/stats/numerics/chi-square-tail';
import type { DiagnoseOptions, Diagnosis, Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Counts from 0 as published. */
function from(shots: number[], lump: Histogram['lump'] = null): Histogram {
  return { kind: 'histogram', counts: shots.map((h, n) => [n, h]), lump };
}

function check(data: Histogram, options: Partial<DiagnoseOptions>): Promise<Diagnosis> {
  return diagnose(data, { ...defaultOptions, ...options });
}

/** Pearson's X² with the counts from `pooled` on as one cell; the law's mean is the sample's. */
function pearson(shots: number[], law: Window, pooled: number): number {
  const total = shots.reduce((sum, h) => sum + h, 0);
  const f = (n: number) => (law.values[n - law.first] ?? 0) / law.scale;
  let x = 0;
  let seen = 0;
  let left = 1;
  for (let n = 0; n < pooled; n++) {
    x += (shots[n] - total * f(n)) ** 2 / (total * f(n));
    seen += shots[n];
    left -= f(n);
  }
  return x + (total - seen - total * left) ** 2 / (total * left);
}

// Pearson 1900, Phil. Mag. 50:157: 26 306 throws of twelve dice, number of fives and sixes.
const weldon = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0];

describe('Weldon’s dice (Pearson 1900)', () => {
  it('are compatible; best law equal trials, G² and floor as recomputed with SciPy', async () => {
    const found = await check(from(weldon), { trials: 12 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.moments.mean.value).toBeCloseTo(4.052383, 6);
    expect(found.fit.levels).toHaveLength(1);
    expect(found.fit.levels[0].trials).toBe(12);
    expect(found.fit.levels[0].p).toBeCloseTo(0.3376986, 7);
    expect(found.fit.gSquared).toBeCloseTo(11.4636, 4);
    expect(found.fit.floor).toBeCloseTo(0.000215, 6);
    expect(found.fit.divergence).toBeCloseTo(0.000218, 6);
  });

  it('printed with "10 or more: 18" are read as a lump', async () => {
    const found = await check(from(weldon.slice(0, 10), { from: 10, shots: 18 }), { trials: 12 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.fit.levels[0].p).toBeCloseTo(0.3377, 4);
    expect(found.distribution.at(-1)).toMatchObject({ count: 10, shots: 18, lump: true });
    expect(found.cautions.join(' ')).toContain('lower limits');
  });

  it('pooled from 10 on, X² = 8.179831 on 9 degrees of freedom', () => {
    // Recomputed with R 4.2: sum((O-E)^2/E) with the fitted p = 0.3376986 (106602/(26306*12)).
    const x = pearson(weldon, binomialWindow(12, 106602 / (26306 * 12)), 10);
    expect(x).toBeCloseTo(8.179831, 5);
    expect(chiSquareTail(x, 9)).toBeCloseTo(0.5161, 3);
  });
});

// Rutherford & Geiger 1910, Phil. Mag. 20:698: alpha particles in 2608 intervals.
const alphas = [57, 203, 383, 525, 532, 408, 273, 139, 45, 27, 10, 4, 0, 1, 1];

describe('alpha particles (Rutherford & Geiger 1910)', () => {
  it('are compatible with an unknown number of trials', async () => {
    const found = await check(from(alphas), {});
    expect(found.answer.verdict).toBe('compatible');
    expect(found.moments.mean.value).toBeCloseTo(3.871549, 6);
    expect(found.moments.variance.value).toBeCloseTo(3.696191, 6);
  });

  it('pooled from 10 on, X² = 12.87262 on 9 degrees of freedom', () => {
    expect(pearson(alphas, poissonWindow(10097 / 2608), 10)).toBeCloseTo(12.87262, 4);
  });
});

describe('smaller published counts, number of trials unknown', () => {
  it('deaths by horse kick (Bortkiewicz 1898) are not ruled out; G² of the Poisson law 0.8682214', async () => {
    const found = await check(from([109, 65, 22, 3, 1]), {});
    expect(found.answer.verdict).not.toBe('ruled-out');
    expect(found.moments.mean.value).toBeCloseTo(0.61, 12);
    const poisson = found.fit.references.find((one) => one.id === 'rare-events')!;
    expect(2 * 200 * poisson.divergence!).toBeCloseTo(0.8682214, 6);
    // The best law of the closure does at least as well as the Poisson one.
    expect(found.fit.gSquared).toBeLessThanOrEqual(0.8682215);
  });

  it('yeast cells (Student 1907, square A) are over the ceiling: variance/mean 1.192276, p about 0.0049', async () => {
    const found = await check(from([213, 128, 37, 18, 3, 1]), {});
    expect(found.moments.fano.value).toBeCloseTo(1.192276, 6);
    const ceiling = found.tests.find((test) => test.id === 'ceiling')!;
    // 1999 resamples at p = 0.0049: standard error 0.0016, four of them allowed.
    expect(Math.abs(ceiling.p - 0.0049)).toBeLessThan(0.0063);
    expect(found.flags.map((flag) => flag.id)).toContain('bunching');
  });

  it('accidents (Greenwood & Yule 1920) are ruled out, with bunching and its other causes', async () => {
    const found = await check(from([447, 132, 42, 21, 3, 2]), {});
    expect(found.moments.fano.value).toBeCloseTo(1.487241, 6);
    expect(found.answer.verdict).toBe('ruled-out');
    const bunching = found.flags.find((flag) => flag.id === 'bunching')!;
    expect(bunching.grade).toBe('shown');
    expect(bunching.otherCauses.join(' ')).toMatch(/drift/);
    expect(bunching.otherCauses.join(' ')).toMatch(/read-out/);
  });
});

describe('hard-core gas on an open line of 20 sites, fugacity 1', () => {
  // Zeros of its independence polynomial: s_k = 4cos²(πk/22), p_k = s/(1+s), so the counts are exactly
  // Poisson-binomial although neighbours exclude each other.
  const p = Array.from({ length: 10 }, (_, k) => 4 * Math.cos((Math.PI * (k + 1)) / 22) ** 2).map(
    (s) => s / (1 + s)
  );

  /** Ways to choose n sites of 20 without neighbours: C(21 − n, n). */
  const ways = [1, 20, 171, 816, 2380, 4368, 5005, 3432, 1287, 220, 11];

  it('has mean 5.680650 and variance 1.887740 by counting configurations', () => {
    const total = ways.reduce((sum, w) => sum + w, 0);
    const mean = ways.reduce((sum, w, n) => sum + n * w, 0) / total;
    const variance = ways.reduce((sum, w, n) => sum + (n - mean) ** 2 * w, 0) / total;
    expect(mean).toBeCloseTo(5.68065, 6);
    expect(variance).toBeCloseTo(1.88774, 6);
    expect(p.reduce((sum, one) => sum + one, 0)).toBeCloseTo(mean, 10);
    expect(p.reduce((sum, one) => sum + one * (1 - one), 0)).toBeCloseTo(variance, 10);
  });

  it('comes out compatible, with the remark "regular", and no word claims independence', async () => {
    const found = await check(from(ways), { trials: 20 });
    expect(found.answer.verdict).toBe('compatible');
    expect(found.flags.map((flag) => [flag.id, flag.grade])).toEqual([['regular', 'shown']]);
    expect(found.answer.statement).toContain('repulsion');
    expect(JSON.stringify(found)).not.toMatch(/prove[sdn]?\b|(are|is) independent\./i);
  });
});
