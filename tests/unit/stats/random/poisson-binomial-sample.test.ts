import { generator } from '$lib/stats/random/generator';
import { poissonBinomialSample } from '$lib/stats/random/poisson-binomial-sample';
import { poissonBinomialShots } from '$lib/stats/random/poisson-binomial-shots';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

const law = (...p: number[]) => ({ levels: p.map((q) => ({ p: q, trials: 1 })), poissonPart: 0 });
const cells = (counts: [number, number][], length: number) => {
  const seen = new Float64Array(length);
  for (const [count, shots] of counts) seen[count] = shots;
  return seen;
};

describe('poissonBinomialSample', () => {
  // Exact probabilities: science.md 11, by hand.
  it.each([
    [law(0.1, 0.2, 0.2), [0.576, 0.352, 0.068, 0.004]],
    [law(0.1, 0.6, 0.7, 0.8), [0.0216, 0.1716, 0.4256, 0.3476, 0.0336]],
    [
      {
        levels: [
          { p: 0.1, trials: 1 },
          { p: 0.2, trials: 2 }
        ],
        poissonPart: 0
      },
      [0.576, 0.352, 0.068, 0.004]
    ]
  ])('follows a law known by hand', (truth, pmf) => {
    const counts = poissonBinomialSample(generator(90, 0), truth, 200_000);
    expect(counts.reduce((sum, [, shots]) => sum + shots, 0)).toBe(200_000);
    expect(counts.map(([count]) => count)).toEqual([...counts.map(([count]) => count)].sort((a, b) => a - b));
    expect(Math.abs(chiSquareScore(cells(counts, pmf.length), pmf))).toBeLessThan(4);
  });

  it('adds the Poisson part', () => {
    // One sure trial and Poisson(0.5): e^{−½} ½^k / k! moved up by one.
    const truth = { levels: [{ p: 1, trials: 1 }], poissonPart: 0.5 };
    const pmf = [0, Math.exp(-0.5)];
    for (let k = 1; k < 20; k++) pmf.push((pmf[k] * 0.5) / k);
    const counts = poissonBinomialSample(generator(91, 0), truth, 200_000);
    expect(Math.abs(chiSquareScore(cells(counts, pmf.length), pmf))).toBeLessThan(4);
  });
});

describe('poissonBinomialShots', () => {
  it('is the list that the histogram tallies', () => {
    const truth = law(0.3, 0.4, 0.9);
    const shots = poissonBinomialShots(generator(92, 5), truth, 1000);
    const counts = poissonBinomialSample(generator(92, 5), truth, 1000);
    for (const [count, number] of counts) expect(shots.filter((n) => n === count).length).toBe(number);
  });

  it('refuses counts that 32 bits cannot hold, and impossible levels', () => {
    const source = generator(1, 1);
    const wide = { levels: [{ p: 0.5, trials: 2 ** 33 }], poissonPart: 0 };
    expect(() => poissonBinomialShots(source, wide, 1)).toThrow(RangeError);
    expect(() => poissonBinomialShots(source, law(1.5), 1)).toThrow(RangeError);
    expect(() => poissonBinomialShots(source, { levels: [], poissonPart: -1 }, 1)).toThrow(RangeError);
  });
});
