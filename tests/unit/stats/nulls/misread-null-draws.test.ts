import { defaultOptions } from '$lib/stats/default-options';
import { fitData } from '$lib/stats/fit/fit-data';
import { chainWindow } from '$lib/stats/misread/chain-window';
import { isReadChain } from '$lib/stats/misread/read-chain';
import { misreadNull } from '$lib/stats/nulls/misread-null';
import { generator } from '$lib/stats/random/generator';
import { fittedDraws, type FittedJob } from '$lib/stats/resampling/fitted-draws';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { readKinks } from '../misread/read-kinks';

const BONDS = 40;
const RATE = 0.01;
const options = { ...defaultOptions, trials: BONDS, geometry: 'open-bonds' as const, misread: RATE };
const nullOf = (histogram: Histogram) => misreadNull(fitData(histogram, BONDS), histogram, RATE, options);

/** Kinks of two probabilities on either half of the chain, spin by spin. */
function halves(seed: number, [near, far]: [number, number], shots: number): Histogram {
  const random = generator(seed, 0);
  const seen = new Map<number, number>();
  for (let shot = 0; shot < shots; shot++) {
    let spin = false;
    let read = random.next() < RATE;
    let count = 0;
    for (let bond = 0; bond < BONDS; bond++) {
      if (random.next() < (bond < BONDS / 2 ? near : far)) spin = !spin;
      const next = random.next() < RATE ? !spin : spin;
      if (next !== read) count++;
      read = next;
    }
    seen.set(count, (seen.get(count) ?? 0) + 1);
  }
  return { kind: 'histogram', counts: [...seen].sort((a, b) => a[0] - b[0]), lump: null };
}

/** Log-likelihood of equal bonds, from their law as it is stepped along the chain. */
function likelihoodOf({ counts }: Histogram, p: number): number {
  const { first, values, scale } = chainWindow([{ p, trials: BONDS }], RATE);
  return counts.reduce((sum, [n, shots]) => sum + shots * Math.log(values[n - first] / scale), 0);
}

describe('resamples of misread kinks are drawn from', () => {
  it('equal bonds of the mean seen, where kinks are alike, on whichever side of the ceiling the variance fell', () => {
    const sides = new Set<boolean>();
    for (let seed = 1; seed <= 12; seed++) {
      const histogram = readKinks(seed, BONDS, 0.06, RATE, 1000);
      const { drawnFrom, levels, logLikelihood } = nullOf(histogram);
      expect(drawnFrom && isReadChain(drawnFrom)).toBe(true);
      if (!drawnFrom || !isReadChain(drawnFrom)) continue;
      expect(drawnFrom.p).toHaveLength(1);
      expect(drawnFrom.rate).toBe(RATE);
      // No other probability of equal bonds is likelier.
      const best = likelihoodOf(histogram, drawnFrom.p[0]);
      for (let p = 0.03; p < 0.09; p += 0.001)
        expect(likelihoodOf(histogram, p)).toBeLessThanOrEqual(best + 1e-6);
      sides.add(isReadChain(levels) && levels.p.length > 1);
      expect(logLikelihood - best).toBeLessThanOrEqual(Math.log(1000) / 2);
    }
    // Both cases were met: a best law of one level, and one of more.
    expect(sides).toEqual(new Set([true, false]));
  });

  it('the best law, where the counts tell it from equal bonds', () => {
    const { drawnFrom, levels } = nullOf(halves(4, [0.3, 0.005], 4000));
    expect(drawnFrom).toBeUndefined();
    expect(isReadChain(levels) && levels.p.length).toBeGreaterThan(1);
  });
});

describe('a law to draw from that is not the best one', () => {
  const histogram = readKinks(5, BONDS, 0.06, RATE, 1000);
  const data = fitData(histogram, BONDS);
  const { levels, logLikelihood, drawnFrom } = nullOf(histogram);
  const plain: FittedJob = { data, levels, logLikelihood, seed: 7 };
  const job: FittedJob = { ...plain, drawnFrom };

  it('leaves the observed values alone', () => {
    const values = (of: FittedJob) => fittedDraws(of).questions.map(({ id, value }) => [id, value]);
    expect(values(job)).toEqual(values(plain));
  });

  it('is what resamples come from: they lie as far from their own fits as those of a job that fitted it', () => {
    if (!drawnFrom) throw new Error('drawn from equal bonds');
    const far = (of: FittedJob) => {
      const draws = fittedDraws(of);
      return Array.from({ length: 10 }, (_, b) => draws.draw(b, 1).divergence);
    };
    expect(far(job)).toEqual(far({ ...plain, levels: drawnFrom }));
    expect(far(job)).not.toEqual(far(plain));
    expect(far({ ...plain, drawnFrom: levels })).toEqual(far(plain));
  });
});
