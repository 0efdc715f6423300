import { ceiling } from '$lib/stats/bounds/ceiling';
import { roundingReaches } from '$lib/stats/cumulants-only/rounding-reaches';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';

describe('roundingReaches', () => {
  it('says of mean and variance what their ceiling says', () => {
    const random = generator(11, 0);
    const seen = { true: 0, false: 0, null: 0 };
    for (let table = 0; table < 400; table++) {
      const trials = table % 3 === 0 ? null : 2 + Math.floor(60 * random.next());
      const mean = (0.1 + 0.8 * random.next()) * (trials ?? 8);
      const halves = [mean * 0.02 * random.next() + 1e-4, mean * 0.02 * random.next() + 1e-4];
      const variance = ceiling(mean, trials) + (6 * random.next() - 2) * Math.max(...halves);
      // Of means that round to it the one with the largest ceiling leaves most room.
      const steps = Array.from({ length: 2001 }, (_, i) => mean + halves[0]! * (i / 1000 - 1));
      const room = Math.max(...steps.map((at) => ceiling(at, trials))) - (variance - halves[1]!);
      const found = roundingReaches(trials, [mean, variance], halves);
      seen[`${found}`]++;
      if (found === null) expect(Math.abs(room)).toBeLessThan(1e-3 * halves[1]!);
      else expect(found, `${trials} ${mean} ${variance} ${halves}`).toBe(room > 0);
    }
    expect(seen.true).toBeGreaterThan(100);
    expect(seen.false).toBeGreaterThan(100);
  });

  it.each([
    // At 5.045 at most the ceiling is below 5.05: none, though the printed point lies 1.2 half units off, less than √2.
    [null, [5.04, 5.1], [0.005, 0.05], false],
    [1_000_000, [5.04, 5.1], [0.005, 0.05], false],
    [null, [5.04, 5.08], [0.005, 0.05], true],
    // Equal trials, N = 12, p = 0.1: κ = 1.2, 1.08, 0.864, to one digit; with a third of 1.1 nothing reaches.
    [12, [1.2, 1.1, 0.9], [0.05, 0.05, 0.05], true],
    [12, [1.2, 1.1, 1.1], [0.05, 0.05, 0.05], false]
  ] as const)('N = %s, %o, half units %o: %s', (trials, values, halves, want) => {
    expect(roundingReaches(trials, [...values], [...halves])).toBe(want);
  });
});
