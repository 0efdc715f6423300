import { smallestExcess } from '$lib/stats/answer/smallest-excess';
import { generator, type Generator } from '$lib/stats/random/generator';
import { cutReach } from '$lib/stats/truncation/cut-reach';
import { keptEqual } from '$lib/stats/truncation/kept-equal';
import { keptShape } from '$lib/stats/truncation/kept-shape';
import { windowMoments } from '$lib/stats/truncation/window-moments';
import type { Window } from '$lib/stats/laws/window';
import { describe, expect, it } from 'vitest';

/** Trials, counts kept, mean of the counts kept. */
const CUTS: [number, { from: number; to: number }, number][] = [
  [20, { from: 0, to: 4 }, 1.9],
  [20, { from: 1, to: Infinity }, 2.3],
  [64, { from: 0, to: 12 }, 9],
  [40, { from: 2, to: 9 }, 4]
];

const cumulative = ({ values }: Window) => {
  let sum = 0;
  return Array.from(values, (f) => (sum += f));
};

/** Variance over the ceiling at the mean of the same shots, drawn from counts `first`, `first` + 1, … */
function ratioOf(
  random: Generator,
  shots: number,
  first: number,
  upTo: number[],
  ceiling: (m: number) => number
) {
  let [sum, squares] = [0, 0];
  for (let s = 0; s < shots; s++) {
    const u = random.next();
    const n =
      first +
      Math.max(
        0,
        upTo.findIndex((c) => u < c)
      );
    sum += n;
    squares += n * n;
  }
  const mean = sum / shots;
  return (squares - shots * mean * mean) / (shots - 1) / ceiling(mean);
}

describe('keptShape', () => {
  it('is 2(1 − 1/N) where nothing is cut: relative variance of s²/(μ(1 − μ/N)) under equal trials', () => {
    // κ4/κ2² − κ3²/κ2³ = (1 − 6pq)/(Npq) − (1 − 2p)²/(Npq) = −2/N.
    for (const [trials, mean] of [
      [12, 3],
      [40, 30],
      [7, 0.2]
    ])
      expect(keptShape(keptEqual(trials, { from: 0, to: Infinity }, mean))!).toBeCloseTo(2 - 2 / trials, 8);
  });

  it('is null for two counts, whose mean is all there is', () => {
    expect(keptShape(keptEqual(9, { from: 3, to: 4 }, 3.4))).toBeNull();
  });

  it.each(CUTS)(
    '%i trials, kept %o, mean %d: excess so large is seen in 80 % of repeats',
    (trials, kept, mean) => {
      const [shots, repeats] = [6000, 2000];
      const window = keptEqual(trials, kept, mean);
      const { shape, most } = cutReach(window, kept, trials);
      const excess = smallestExcess(mean, trials, shots, shape)!;
      expect(excess).toBeLessThan(most);
      const ceiling = (m: number) => windowMoments(keptEqual(trials, kept, m)).variance;
      // A finer table than one search a repeat, at most 1e-4 off.
      const grid = Array.from({ length: 401 }, (_, i) => ceiling(mean - 0.4 + i * 0.002));
      const near = (m: number) => {
        const at = (m - mean + 0.4) / 0.002;
        const i = Math.min(399, Math.max(0, Math.floor(at)));
        return grid[i] + (at - i) * (grid[i + 1] - grid[i]);
      };
      // Two settings of equal trials so cut, half each, apart by as much as gives the excess: bisection.
      const mixed = (shift: number): Window => {
        const [low, high] = [keptEqual(trials, kept, mean - shift), keptEqual(trials, kept, mean + shift)];
        return { ...low, values: low.values.map((f, i) => (f + high.values[i]) / 2) };
      };
      let [low, high] = [0, Math.min(mean - kept.from, Math.min(kept.to, trials) - mean) * 0.99];
      for (let step = 0; step < 40; step++) {
        const middle = (low + high) / 2;
        if (windowMoments(mixed(middle)).variance / windowMoments(window).variance - 1 < excess) low = middle;
        else high = middle;
      }
      const drawn = (law: Window, stream: number) => {
        const upTo = cumulative(law);
        return Array.from({ length: repeats }, (_, r) =>
          ratioOf(generator(11 + stream, r), shots, law.first, upTo, near)
        ).sort((a, b) => a - b);
      };
      const under = drawn(window, 0);
      const critical = under[Math.floor(0.95 * repeats)];
      const seen = drawn(mixed(high), 1).filter((ratio) => ratio > critical).length / repeats;
      // Repeats leave 1.2 % of chance in the power, 0.6 % of level behind the critical value: together 2.5 %; twice that.
      expect(Math.abs(seen - 0.8)).toBeLessThan(0.05);
    }
  );
});
