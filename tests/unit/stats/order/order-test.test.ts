import { chiSquareTail } from '$lib/stats/numerics/chi-square-tail';
import { normalCdf } from '$lib/stats/numerics/normal-cdf';
import { autocorrelations } from '$lib/stats/order/autocorrelations';
import { ljungBox } from '$lib/stats/order/ljung-box';
import { orderTest } from '$lib/stats/order/order-test';
import { runsCount } from '$lib/stats/order/runs-count';
import { generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';
import { describe, expect, it } from 'vitest';
import { DISCOVERIES } from './discoveries';
import { meanAndVariance, orders } from './orders';

async function run(shots: number[], resamples = 1999, seed = 1) {
  const outcome = await orderTest(shots, { resamples, seed });
  if (!outcome.ok) throw new Error(outcome.reason);
  return outcome;
}

describe('orderTest', () => {
  it('has R’s Ljung–Box for yearly counts of discoveries, which drift', async () => {
    const result = await run(DISCOVERIES);
    // R 4.2.2: Box.test(discoveries, lag = 10, type = "Ljung")
    expect(result.ljungBox).toBeCloseTo(28.18304917721899, 10);
    expect(result.ljungBoxP).toBeCloseTo(0.00168732946423, 12);
    expect(result.lags).toBe(10);
    expect(result.p).toBeLessThan(0.01);
    expect(result.statistic).toBeCloseTo(-Math.log(Math.min(result.ljungBoxP, result.runsP)), 12);
  });

  it.each([[[0, 1, 0, 2, 3, 5, 4]], [[0, 4, 0, 5, 1, 3, 0]], [[7, 1, 2, 0, 0, 3, 0]]])(
    'has the p-value of all 5040 orders of %j',
    async (shots) => {
      // Written out anew: one lag, runs about an even cut, moments of the runs by enumeration.
      const all = orders(shots);
      const result = await run(shots, 40_000);
      const sorted = [...shots].sort((a, b) => a - b);
      const cut = sorted[4] > sorted[3] ? sorted[3] : sorted[2];
      const runs = all.map((order) => runsCount(order, cut));
      const { mean, variance } = meanAndVariance(runs);
      const smaller = (order: number[]) =>
        Math.min(
          chiSquareTail(ljungBox(7, autocorrelations(order, 1)), 1),
          2 * normalCdf(-Math.abs(runsCount(order, cut) - mean) / Math.sqrt(variance))
        );
      const observed = smaller(shots);
      const exact = all.filter((order) => smaller(order) <= observed * (1 + 1e-9)).length / all.length;
      expect(result.lags).toBe(1);
      expect(result.runsExpected).toBeCloseTo(mean, 12);
      // Each stopped p has a relative error of √((1 − p)/100) and a bias of p/100.
      let sum = 0;
      for (let seed = 0; seed < 40; seed++) sum += (await run(shots, 40_000, seed)).p;
      expect(Math.abs(sum / 40 - exact)).toBeLessThan(exact * (0.01 + 4 * Math.sqrt((1 - exact) / 4000)));
    }
  );

  it('keeps 5 % when order means nothing, each part giving its share', async () => {
    const source = generator(22, 0);
    const runs = 400;
    let [alarms, bySerial] = [0, 0];
    for (let i = 0; i < runs; i++) {
      const result = await run(
        Array.from({ length: 60 }, () => poissonSample(source, 0.7)),
        199
      );
      if (result.p <= 0.05) {
        alarms++;
        if (result.ljungBoxP < result.runsP) bySerial++;
      }
    }
    // 5 % of 400 is 20, standard deviation 4.4.
    expect(alarms).toBeGreaterThan(20 - 3 * 4.4);
    expect(alarms).toBeLessThan(20 + 3 * 4.4);
    expect(bySerial).toBeGreaterThan(alarms * 0.15);
    expect(bySerial).toBeLessThan(alarms * 0.85);
  });

  it('finds slow drift, alternation, and what lies ten shots apart', async () => {
    const source = generator(23, 0);
    const shots = (mean: (i: number) => number) =>
      Array.from({ length: 500 }, (_, i) => poissonSample(source, mean(i)));
    expect((await run(shots((i) => (i < 250 ? 1.5 : 2.2)))).p).toBeLessThan(0.01);
    expect((await run(shots((i) => 2 + 1.4 * (i % 2)))).p).toBeLessThan(0.01);
    expect((await run(shots((i) => (i % 10 === 0 ? 4 : 1.5)))).p).toBeLessThan(0.01);
  });

  it('goes to the limit law on long lists, and it agrees with permutations', async () => {
    const source = generator(24, 0);
    const shots = Array.from({ length: 20_001 }, (_, i) => poissonSample(source, 1.5 + 0.03 * (i % 2)));
    const limit = await run(shots);
    const permuted = await run(shots.slice(0, 20_000));
    expect([limit.source, permuted.source]).toEqual(['limit', 'permuted']);
    expect(Math.abs(limit.p - permuted.p)).toBeLessThan(0.15 * permuted.p + 0.02);
  });

  it('permutes long lists of shots that are mostly alike', async () => {
    const shots = Array.from({ length: 20_001 }, (_, i) => (i % 700 === 0 ? 1 : 0));
    expect((await run(shots, 99)).source).toBe('permuted');
  });

  it('gives a finite statistic and a p above 0 where the order shouts', async () => {
    const stairs = Array.from({ length: 40_000 }, (_, i) => Math.floor(i / 4000));
    const { statistic, p, smallestP, source } = await run(stairs);
    expect([Number.isFinite(statistic), p, smallestP, source]).toEqual([true, 1e-300, 1e-300, 'limit']);
  });

  it('says why it cannot run', async () => {
    const few = await orderTest([1, 2, 3, 4], { resamples: 99, seed: 1 });
    expect(few).toEqual({ ok: false, reason: 'Fewer than 5 shots.' });
    const alike = await orderTest([3, 3, 3, 3, 3, 3], { resamples: 99, seed: 1 });
    expect(alike).toEqual({ ok: false, reason: 'All shots have the same count.' });
  });
});
