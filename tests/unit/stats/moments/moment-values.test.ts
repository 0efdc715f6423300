import { kStatistics } from '$lib/stats/moments/k-statistics';
import { momentValues } from '$lib/stats/moments/moment-values';
import { describe, expect, it } from 'vitest';

// Weldon's dice, Pearson 1900, Phil. Mag. 50:157.
const WELDON = [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0];
const CASES: [string, [number, number][], number | null][] = [
  ['Weldon', WELDON.map((h, n) => [n, h]), 12],
  [
    'few shots',
    [
      [0, 3],
      [1, 2],
      [5, 1]
    ],
    null
  ],
  [
    '2^40 shots',
    [
      [0, 2 ** 38],
      [1, 2 ** 39],
      [2, 2 ** 38]
    ],
    4
  ]
];

function values(counts: [number, number][], trials: number | null): Float64Array {
  const into = new Float64Array(12);
  const shots = Float64Array.from(counts, ([, h]) => h);
  const total = shots.reduce((sum, h) => sum + h, 0);
  momentValues(
    Float64Array.from(counts, ([n]) => n),
    shots,
    total,
    trials,
    into
  );
  return into;
}

describe('momentValues', () => {
  it.each(CASES)('agrees with the exact k-statistics: %s', (_, counts, trials) => {
    const exact = kStatistics(counts);
    const ceiling = trials === null ? exact.mean : exact.mean * (1 - exact.mean / trials);
    const expected = [exact.mean, exact.variance!, exact.third!, exact.fourth!];
    expected.push(exact.variance! / exact.mean, exact.variance! / ceiling);
    const scale = Math.sqrt(exact.variance!);
    const found = values(counts, trials);
    expected.forEach((value, j) =>
      expect(Math.abs(found[j] - value)).toBeLessThan(1e-11 * (Math.abs(value) + scale))
    );
  });

  it('has the errors of the jackknife: one shot less of each count in turn', () => {
    // Many shots, so that the jackknife and the influence function agree to a part in S.
    const counts: [number, number][] = WELDON.slice(0, 12).map((h, n) => [n, h]);
    const shots = counts.reduce((sum, [, h]) => sum + h, 0);
    const errors = values(counts, 12).subarray(6);
    const without = counts.map((_, i) =>
      values(
        counts.map(([n, h], j) => [n, i === j ? h - 1 : h]),
        12
      )
    );
    for (let j = 0; j < 6; j++) {
      const average = counts.reduce((sum, [, h], i) => sum + h * without[i][j], 0) / shots;
      const square = counts.reduce((sum, [, h], i) => sum + h * (without[i][j] - average) ** 2, 0);
      expect(Math.sqrt(((shots - 1) / shots) * square) / errors[j]).toBeCloseTo(1, 2);
    }
  });
});
