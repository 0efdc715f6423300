import { sampleMoments } from '$lib/stats/fit/sample-moments';
import { chainBlocks } from '$lib/stats/misread/chain-blocks';
import { chainFit } from '$lib/stats/misread/chain-fit';
import { chainRefit } from '$lib/stats/misread/chain-refit';
import { chainScore } from '$lib/stats/misread/chain-score';
import { chainSlopes, chainSpace } from '$lib/stats/misread/chain-space';
import { chainMoments } from '$lib/stats/misread/chain-moments';
import { chainWindow } from '$lib/stats/misread/chain-window';
import { generator } from '$lib/stats/random/generator';
import { redraw } from '$lib/stats/resampling/redraw';
import { describe, expect, it } from 'vitest';

/** Shares of a law as a histogram of S = 1e5 shots, and its own log-likelihood. */
function exact(p: number[], rate: number) {
  const { first, values } = chainWindow(
    p.map((one) => ({ p: one, trials: 1 })),
    rate,
    1e-15,
    1
  );
  const shots = values.map((f) => f * 1e5);
  const data = { trials: p.length, first, shots, lump: null, below: null, total: 1e5, withoutEmpty: false };
  return { data, itself: values.reduce((sum, f) => sum + 1e5 * f * Math.log(f), 0) };
}

describe('chainSlopes', () => {
  it('are what small changes of each level give', () => {
    const runs = [
      { level: 0, trials: 3 },
      { level: 1, trials: 4 },
      { level: 0, trials: 2 }
    ];
    const { data } = exact([0.1, 0.2, 0.3, 0.05, 0.1, 0.2, 0.1, 0.1, 0.1], 0.03);
    for (const kept of [null, { from: 1, to: 6 }]) {
      const seen = kept ? { ...data, first: 1, shots: data.shots.slice(1, 7) } : data;
      const at = (p: number[]) => {
        const space = chainSpace(9, 2);
        chainSlopes(space, { p, runs }, 0.03, 0);
        return chainScore(space, 2, seen, kept);
      };
      const { slope } = at([0.3, 0.08]);
      const h = 1e-6;
      const first = (at([0.3 + h, 0.08]).value - at([0.3 - h, 0.08]).value) / (2 * h);
      const second = (at([0.3, 0.08 + h]).value - at([0.3, 0.08 - h]).value) / (2 * h);
      expect(Math.abs(slope[0] / first - 1)).toBeLessThan(1e-6);
      expect(Math.abs(slope[1] / second - 1)).toBeLessThan(1e-6);
    }
  });

  it('are the same to the last bit at counts up to a limit, whether or not those above are built', () => {
    const runs = [
      { level: 0, trials: 20 },
      { level: 1, trials: 40 }
    ];
    for (const trim of [0, 1e-20]) {
      const [whole, part] = [chainSpace(60, 2), chainSpace(60, 2)];
      chainSlopes(whole, { p: [0.2, 0.03], runs }, 0.01, trim);
      chainSlopes(part, { p: [0.2, 0.03], runs }, 0.01, trim, 12);
      expect(part.high).toBe(12);
      expect(whole.high).toBeGreaterThan(30);
      const upTo = (values: Float64Array) => values.slice(whole.low, 13);
      expect(part.low).toBe(whole.low);
      expect(upTo(part.f)).toEqual(upTo(whole.f));
      expect(upTo(part.g)).toEqual(upTo(whole.g));
      for (const j of [0, 1]) {
        expect(upTo(part.df[j])).toEqual(upTo(whole.df[j]));
        expect(upTo(part.dg[j])).toEqual(upTo(whole.dg[j]));
      }
    }
  });
});

describe('chainFit', () => {
  const random = generator(5, 0);
  it('finds a chain of two bonds in turn, one all but sure, where misreads are many', () => {
    // The truth itself is the reference; with at most twelve stretches the nearest law lay 0.02 nats a shot off.
    const { data, itself } = exact(
      Array.from({ length: 50 }, (_, j) => (j % 2 ? 0.9 : 0.05)),
      0.05
    );
    expect((itself - chainFit(data, 0.05).value) / 1e5).toBeLessThan(2e-5);
  });

  it.each([
    ['equal bonds', new Array<number>(100).fill(0.05), 1e-12],
    ['p rising from 0 to 0.3', Array.from({ length: 100 }, (_, j) => (0.3 * j) / 100), 1e-9],
    ['p anywhere from 0 to 0.2', Array.from({ length: 100 }, () => 0.2 * random.next()), 1e-7],
    ['0.02 and 0.2 alternating', Array.from({ length: 100 }, (_, j) => (j % 2 ? 0.2 : 0.02)), 5e-6],
    ['five sure bonds apart', Array.from({ length: 60 }, (_, j) => (j % 12 === 0 ? 0.95 : 0.02)), 2e-5]
  ])('comes near the truth it is given: %s', (_name, p, most) => {
    const { data, itself } = exact(p, 0.01);
    const { chain, value } = chainFit(data, 0.01);
    const divergence = (itself - value) / 1e5;
    expect(divergence).toBeGreaterThan(-1e-12);
    expect(divergence).toBeLessThan(most);
    // The likelihood it tells is that of the chain it gives.
    const again = chainWindow(chainBlocks(chain), 0.01, 0, 1);
    const told = data.shots.reduce(
      (sum, h, i) => sum + h * Math.log(again.values[data.first + i - again.first]),
      0
    );
    expect(Math.abs(told - value)).toBeLessThan(1e-5);
  });
});

describe('chainRefit', () => {
  it('is within a fraction of a nat of the long search, and not worse than the law drawn from', () => {
    const p = Array.from({ length: 40 }, (_, j) => (0.3 * j) / 40);
    const { data } = exact(p, 0.02);
    const from = { ...chainFit(data, 0.02).chain, rate: 0.02 };
    const window = chainWindow(chainBlocks(from), 0.02, 1e-18, 1);
    const source = redraw(window, data, 3000);
    let short = 0;
    for (let b = 0; b < 12; b++) {
      const drawn = source.draw(generator(9, b));
      const quick = chainRefit(drawn, from);
      const long = chainFit(drawn, 0.02);
      const itself = drawn.shots.reduce(
        (sum, h, i) => (h > 0 ? sum + h * Math.log(window.values[drawn.first + i - window.first]) : sum),
        0
      );
      expect(quick.logLikelihood).toBeGreaterThan(itself - 1e-6);
      short += Math.max(0, long.value - quick.logLikelihood) / 12;
      // Equal up to the ends of the chain, a fit keeps the mean.
      const { mean } = chainMoments(chainBlocks(quick.levels), 0.02);
      expect(Math.abs(mean - sampleMoments(drawn).mean)).toBeLessThan(0.02);
    }
    expect(short).toBeLessThan(0.3);
  });
});
