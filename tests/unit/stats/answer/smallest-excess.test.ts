import { ceiling } from '$lib/stats/bounds/ceiling';
import { dispersionShape, smallestExcess } from '$lib/stats/answer/smallest-excess';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { gammaSample } from '$lib/stats/random/gamma-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';
import { windowMoments } from '$lib/stats/truncation/window-moments';
import { describe, expect, it } from 'vitest';

/** Variance over ceiling of S counts drawn anew, many times. */
function ratios(
  repeats: number,
  shots: number,
  trials: number | null,
  draw: (random: Generator) => number
): number[] {
  return Array.from({ length: repeats }, (_, repeat) => {
    const random = generator(5, repeat);
    let [sum, square] = [0, 0];
    for (let s = 0; s < shots; s++) {
      const n = draw(random);
      sum += n;
      square += n * n;
    }
    return (square - (sum * sum) / shots) / (shots - 1) / ceiling(sum / shots, trials);
  });
}

describe('dispersionShape', () => {
  it('is 2 + κ4/κ2² − κ3²/κ2³ of equal trials, from their pmf', () => {
    for (const [trials, p] of [
      [2, 0.5],
      [5, 0.1],
      [12, 0.3],
      [60, 0.02],
      [60, 0.97]
    ] as const) {
      // Bin(N, p) by its recursion.
      const values = [(1 - p) ** trials];
      for (let n = 1; n <= trials; n++) values.push((values[n - 1]! * (trials - n + 1) * p) / (n * (1 - p)));
      const { mean, variance } = windowMoments({ first: 0, values: Float64Array.from(values), scale: 1 });
      const central = (power: number) => values.reduce((sum, f, n) => sum + f * (n - mean) ** power, 0);
      const want = central(4) / variance ** 2 - 1 - central(3) ** 2 / variance ** 3;
      expect(dispersionShape(trials * p, trials)! / want).toBeCloseTo(1, 9);
    }
  });

  it('is S times the relative variance of variance over ceiling, by simulation, at low means too', () => {
    const cases: [number, number, number | null, (random: Generator) => number][] = [
      [3.6, 400, 12, (random) => binomialSample(random, 12, 0.3)],
      // A variance alone would have 2 + 1/μ = 7 here.
      [0.2, 2000, null, (random) => poissonSample(random, 0.2)]
    ];
    for (const [mean, shots, trials, draw] of cases) {
      const found = ratios(2000, shots, trials, draw);
      const middle = found.reduce((a, b) => a + b) / 2000;
      const spread = found.reduce((a, b) => a + (b - middle) ** 2, 0) / 1999;
      // 2000 repeats give a variance to 3 %; four of those.
      expect(Math.abs((shots * spread) / middle ** 2 / dispersionShape(mean, trials)! - 1)).toBeLessThan(
        0.13
      );
    }
  });

  it('is null where nothing can vary about the ceiling', () => {
    expect(
      [
        [0, 5],
        [5, 5],
        [0, null],
        [0.3, 1]
      ].map(([mean, trials]) => dispersionShape(mean!, trials!))
    ).toEqual([null, null, null, null]);
  });
});

describe('smallestExcess', () => {
  it('is about 2.49·√(2(1 − 1/N)/S) of the ceiling', () => {
    expect(smallestExcess(0.1, null, 20_000)).toBeCloseTo(0.0249, 12);
    // Two trials at any mean: 2.49·√(1/300).
    expect(smallestExcess(1, 2, 300)).toBeCloseTo(2.49 / Math.sqrt(300), 12);
    expect(smallestExcess(0, 5, 100)).toBeNull();
  });

  it('is seen in four of five repeats, by the variance alone at 5 %, at a low mean too', () => {
    // Negative binomial, mean μ and variance μ(1 + x): a Poisson law whose rate is gamma distributed, shape μ/x.
    const [mean, shots, repeats] = [1, 8000, 1500];
    const excess = smallestExcess(mean, null, shots)!;
    const still = ratios(repeats, shots, null, (random) => poissonSample(random, mean)).sort((a, b) => a - b);
    const cut = still[Math.ceil(0.95 * repeats)]!;
    const moved = ratios(repeats, shots, null, (random) =>
      poissonSample(random, excess * gammaSample(random, mean / excess))
    );
    const seen = moved.filter((ratio) => ratio > cut).length / repeats;
    // 1500 repeats give a share of 0.8 to ±0.01 and the cut adds as much; the formula is one of normal numbers.
    expect(Math.abs(seen - 0.8)).toBeLessThan(0.05);
  });
});
