import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import { lawRate } from '$lib/stats/laws/law-rate';
import { lawWindow } from '$lib/stats/laws/law-window';
import { clopperPearson } from '$lib/stats/numerics/clopper-pearson';
import { describe, expect, it } from 'vitest';

describe('rate function of a document', () => {
  it('has its horizon at ln(S)/N and falls silent where an empty count says nothing', async () => {
    const data = {
      kind: 'histogram' as const,
      counts: [
        [0, 28],
        [1, 38],
        [2, 24],
        [3, 10]
      ] as [number, number][],
      lump: null
    };
    const { rate } = await diagnose(data, { ...defaultOptions, resamples: 19, trials: 12 });
    expect(rate.horizon).toBeCloseTo(Math.log(100) / 12, 12);
    // Upper 95 % limit of a count never seen in 100 shots: 1 − 0.05^{1/100} = 0.0295130 (rule of three: 0.03).
    expect(rate.silence).toBeCloseTo(-Math.log(1 - 0.05 ** (1 / 100)) / 12, 12);
    const [first] = rate.points;
    expect(first.empirical).toBeCloseTo(-Math.log(0.28) / 12, 12);
    const { low, high } = clopperPearson(28, 100);
    expect(first.low).toBeCloseTo(-Math.log(high) / 12, 12);
    expect(first.high).toBeCloseTo(-Math.log(low) / 12, 12);
    const unseen = rate.points.find((point) => point.count === 5)!;
    expect([unseen.empirical, unseen.high]).toEqual([null, null]);
    expect(unseen.low).toBeGreaterThan(0);
  });

  it('Bin(100, 0.1), n ≥ 20: rate, Chernoff bound and exact tail (Bahadur & Rao 1960; recomputed with SciPy)', () => {
    const law = { levels: [{ p: 0.1, trials: 100 }], poissonPart: 0 };
    const rate = lawRate(law, 20);
    expect(rate / 100).toBeCloseTo(0.04440301, 8);
    expect(Math.exp(-rate)).toBeCloseTo(0.01179239, 8);
    const { first, values, scale } = lawWindow(law);
    const tail = values.reduce((sum, value, i) => (i + first >= 20 ? sum + value / scale : sum), 0);
    expect(tail).toBeCloseTo(0.001978561, 9);
    // Lattice correction: e^{−NI}/((1 − e^{−θ})σ√(2πN)) at the tilt θ, σ² of one trial.
    const theta = Math.log((0.2 * 0.9) / (0.1 * 0.8));
    expect(Math.exp(-rate) / ((1 - Math.exp(-theta)) * Math.sqrt(2 * Math.PI * 100 * 0.16))).toBeCloseTo(
      0.002117018,
      9
    );
  });
});

describe('tails of a document', () => {
  it('stand in the order fitted ≤ Chernoff ≤ Chernoff from the mean, and observed tails end at all shots', async () => {
    const data = {
      kind: 'histogram' as const,
      counts: [
        [0, 28],
        [1, 38],
        [2, 24],
        [3, 10]
      ] as [number, number][],
      lump: null
    };
    const { tails } = await diagnose(data, { ...defaultOptions, resamples: 19, trials: 12 });
    for (const point of tails.points) {
      expect(point.fitted).toBeLessThanOrEqual(point.chernoff * (1 + 1e-9));
      expect(point.chernoff).toBeLessThanOrEqual(point.meanChernoff * (1 + 1e-9));
      expect(point.hoeffding).toBeLessThanOrEqual(1);
      expect(point.fitted).toBeLessThanOrEqual(point.hoeffding * (1 + 1e-9));
    }
    expect(tails.points.find((p) => p.side === 'high' && p.count === 3)!.shots).toBe(10);
    expect(tails.points.find((p) => p.side === 'low' && p.count === 1)!.shots).toBe(66);
  });
});
