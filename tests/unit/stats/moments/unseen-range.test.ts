import { unseenRange } from '$lib/stats/moments/unseen-range';
import { describe, expect, it } from 'vitest';

/** The same by writing the law down: shares of the counts seen times 1 − e, and e at the unseen count. */
function byHand(counts: [number, number][], unseen: number, trials: number | null, tail: number) {
  const shots = counts.reduce((sum, [, h]) => sum + h, 0);
  const e = 1 - tail ** (1 / shots);
  const law = [...counts.map(([n, h]) => [n, ((1 - e) * h) / shots]), [unseen, e]];
  const mean = law.reduce((sum, [n, f]) => sum + n * f, 0);
  const variance = law.reduce((sum, [n, f]) => sum + (n - mean) ** 2 * f, 0);
  const ceiling = trials === null ? mean : mean * (1 - mean / trials);
  return { variance, fano: variance / mean, dispersion: variance / ceiling };
}

describe('unseenRange', () => {
  it('adds one unseen count beside those seen: the next above widens, one near the mean narrows', () => {
    const counts: [number, number][] = [
      [0, 30],
      [1, 9],
      [4, 1]
    ];
    const mean = 13 / 40;
    const variance = 25 / 40 - mean ** 2;
    const { least, largest } = unseenRange(counts, mean, variance, 8, 0.025);
    const hands = [2, 3, 5].map((n) => byHand(counts, n, 8, 0.025));
    for (const key of ['variance', 'fano', 'dispersion'] as const) {
      expect(largest[key]).toBeCloseTo(Math.max(...hands.map((hand) => hand[key])), 12);
      expect(least[key]).toBeCloseTo(Math.min(...hands.map((hand) => hand[key])), 12);
    }
  });

  it('finds the gap at the mean when no neighbour of a count is there', () => {
    const counts: [number, number][] = [
      [0, 50],
      [100, 50]
    ];
    const { least } = unseenRange(counts, 50, 2500, 100, 0.025);
    expect(least.variance).toBeCloseTo(byHand(counts, 50, 100, 0.025).variance, 9);
  });

  it('says so when every count of 0 … N was seen', () => {
    const { least, largest } = unseenRange(
      [
        [0, 5],
        [1, 5]
      ],
      0.5,
      0.25,
      1,
      0.025
    );
    expect(largest.dispersion).toBe(-Infinity);
    expect(least.dispersion).toBe(Infinity);
  });
});
