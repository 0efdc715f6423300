import { describe, expect, it } from 'vitest';
import { judgeCumulants } from '$lib/stats/cumulants-only/judge-cumulants';
import type { PublishedCumulants } from '$lib/stats/cumulants-only/published-cumulants';
import { sayCumulants } from '$lib/stats/cumulants-only/say-cumulants';
import { kStatistics } from '$lib/stats/moments/k-statistics';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { poissonSample } from '$lib/stats/random/poisson-sample';

const printed = (
  trials: number | null,
  mean: [number, number],
  variance: [number, number],
  third: [number, number] | null = null,
  fourth: [number, number] | null = null
): PublishedCumulants => {
  const of = (pair: [number, number] | null) => pair && { value: pair[0], error: pair[1] };
  return { trials, mean: of(mean)!, variance: of(variance)!, third: of(third), fourth: of(fourth) };
};

describe('at the edge of what can be printed', () => {
  it('a variance of 0 is what trials all sure or excluded have, where the mean is whole', () => {
    const whole = judgeCumulants(printed(null, [4, 0.01], [0, 0.01]));
    expect(whole.verdict).toBe('compatible');
    expect(whole.nearest.distance).toBe(0);
    // A count with mean 3.5 is 3 or 4 at best: variance ½·½ = 0.25, and 0 is 25 errors of 0.01 below.
    const half = judgeCumulants(printed(null, [3.5, 0.01], [0, 0.01]));
    expect(half.verdict).toBe('impossible');
    expect(sayCumulants(half)).toMatch(/the variance is below its floor for any counts, by 25 of its errors/);
    expect(sayCumulants(half)).toMatch(/or a standard deviation where a variance belongs\.$/);
  });

  it.each([
    [null, 0],
    [10, 0],
    [10, 10]
  ])('with N = %s and a mean of %d there is no ceiling, and it says so', (trials, mean) => {
    const judged = judgeCumulants(printed(trials, [mean, 0.05], [0, 0.1]));
    expect(judged.verdict).toBe('undecided');
    expect(judged.dispersion.value).toBeNull();
    expect(sayCumulants(judged)).toMatch(/this mean leaves no room for a variance, so there is no ceiling/);
  });

  it('errors a billion times apart are not called chance, nor compatible', () => {
    // Of 50 trials with mean 4 the ceiling is 4 − 16/50 = 3.68: independent trials have 3.6, whatever its error.
    for (const error of [1e-10, 1e-11]) {
      const judged = judgeCumulants(printed(50, [4, 0.05], [3.6, error]));
      expect(judged.settled).toBe(false);
      expect(judged.verdict).toBe('undecided');
      expect(sayCumulants(judged)).toMatch(/cannot be worked out in sixteen digits/);
    }
    const judged = judgeCumulants(printed(50, [4, 0.05], [3.6, 1e-6]));
    expect(judged.settled).toBe(true);
    expect(judged.verdict).toBe('compatible');
    expect(judged.nearest.distance).toBe(0);
  });
});

describe('judgeCumulants', () => {
  it('Rutherford and Geiger 1910: mean 3.871549, variance 3.696191, 2608 shots: compatible, N unknown', () => {
    // Errors from the counts: √(κ2/S) and √((κ4 + 2κ2²)/S), about 0.038 and 0.11.
    const judged = judgeCumulants(printed(null, [3.871549, 0.038], [3.696191, 0.11]));
    expect(judged.verdict).toBe('compatible');
    expect(judged.nearest.distance).toBe(0);
    expect(judged.p).toBe(1);
    // N* = μ²/(μ − s²) = 3.871549²/0.175358.
    expect(judged.criticalTrials).toBeCloseTo(85.475, 2);
  });

  it("Weldon's dice, Pearson 1900: mean 4.052383 of 12: at the ceiling of equal trials", () => {
    // By hand: 4.052383 − 4.052383²/12 = 4.052383 − 1.368484 = 2.683899.
    const at = judgeCumulants(printed(12, [4.052383, 0.01], [2.69825, 0.023]));
    expect(at.verdict).toBe('compatible');
    expect(at.conditions.find(({ order, side }) => order === 2 && side === 'ceiling')?.limit).toBeCloseTo(
      2.683899,
      5
    );
  });

  it('Greenwood and Yule 1920, accidents: variance over mean 1.487241: ruled out, with the inequality named', () => {
    // 647 shots, mean 0.4652: variance 0.6919; errors √(κ2/S) and about 0.07.
    const judged = judgeCumulants(printed(null, [0.4652, 0.0327], [0.6919, 0.06]));
    expect(judged.verdict).toBe('ruled-out');
    const broken = judged.conditions.filter(({ standing }) => standing === 'broken');
    expect(broken).toHaveLength(1);
    expect(broken[0]).toMatchObject({ order: 2, side: 'ceiling' });
    // Slack κ1 − κ2 = −0.2267, its error √(0.0327² + 0.06²) = 0.0683.
    expect(broken[0].slack / broken[0].error).toBeCloseTo(-0.2267 / 0.06833, 2);
    expect(judged.nearest.distance).toBeCloseTo(0.2267 / 0.06833, 2);
    expect(sayCumulants(judged)).toMatch(/No independent trials have these cumulants: the variance is above/);
  });

  it('p is the chi-square tail: two cumulants 3.5 errors off give e^{−3.5²/2}', () => {
    const judged = judgeCumulants(printed(null, [4, 0.3], [4 + 3.5 * 0.5, 0.4]));
    expect(judged.nearest.distance).toBeCloseTo(3.5, 6);
    expect(judged.p).toBeCloseTo(Math.exp(-(3.5 ** 2) / 2), 6);
    expect(judged.pAnyErrors).toBeGreaterThan(judged.p);
  });

  it('has the zero-temperature ratios 0.584 and 0.146 inside, as published with 0.004 and 0.044', () => {
    const judged = judgeCumulants(printed(null, [10, 0.01], [5.84, 0.04], [1.46, 0.44]));
    expect(judged.nearest.distance).toBe(0);
  });

  it('says of what no counts have that it is the table', () => {
    // A kurtosis under 1 + skewness²: κ4 = −5 with κ2 = 1 (the least is κ3²/κ2 − 2κ2² = −2).
    const judged = judgeCumulants(printed(null, [3, 0.01], [1, 0.01], [0, 0.05], [-5, 0.1]));
    expect(judged.verdict).toBe('impossible');
    expect(sayCumulants(judged)).toMatch(/No counts at all/);
    // As far out, but with errors that leave room.
    const near = judgeCumulants(printed(10, [3.5, 0.2], [0.2, 0.1]));
    expect(near.verdict).not.toBe('impossible');
    expect(sayCumulants(near)).toMatch(
      /As printed no counts at all have them: the variance is below its floor/
    );
    // Whole counts of mean 3.5 scatter by 0.25 at least.
    expect(judgeCumulants(printed(10, [3.5, 0.001], [0.1, 0.001])).verdict).toBe('impossible');
  });

  it('is undecided where the variance is hardly known', () => {
    const judged = judgeCumulants(printed(null, [3, 0.2], [3, 0.9]));
    expect(judged.verdict).toBe('undecided');
    expect(sayCumulants(judged)).toMatch(/not known well enough/);
  });
});

/** Cumulants of one experiment with the errors that its own resampled shots give, as a table would print them. */
function experiment(
  random: Generator,
  draw: () => number,
  trials: number | null,
  shots: number,
  order: number
) {
  const counts = Array.from({ length: shots }, draw);
  const of = (shown: number[]) => {
    const tally = new Map<number, number>();
    for (const n of shown) tally.set(n, (tally.get(n) ?? 0) + 1);
    const k = kStatistics([...tally].sort((a, b) => a[0] - b[0]));
    return [k.mean, k.variance!, k.third!, k.fourth!].slice(0, order);
  };
  const seen = of(counts);
  const draws = Array.from({ length: 60 }, () =>
    of(counts.map(() => counts[Math.floor(shots * random.next())]))
  );
  const pairs = seen.map((value, i): [number, number] => {
    const mean = draws.reduce((sum, d) => sum + d[i], 0) / draws.length;
    return [value, Math.sqrt(draws.reduce((sum, d) => sum + (d[i] - mean) ** 2, 0) / (draws.length - 1))];
  });
  return judgeCumulants(printed(trials, pairs[0], pairs[1], pairs[2] ?? null, pairs[3] ?? null));
}

describe('the p of judgeCumulants, on cumulants of simulated shots, whose errors are correlated', () => {
  const REPEATS = 150;
  // Truths on the very edge of the body, where false alarms are most frequent.
  it.each([
    ['Poisson 0.7', null, 2],
    ['Poisson 4', null, 3],
    ['Poisson 4', null, 4],
    ['12 equal trials', 12, 3],
    ['12 equal trials', 12, 4]
  ] as const)('%s, N %s, %i cumulants: p ≤ 0.05 in 7 of 100 at most', (name, trials, order) => {
    const random = generator(77, order + (trials ?? 100));
    const mean = name.endsWith('0.7') ? 0.7 : 4;
    const draw = () => (trials ? binomialSample(random, trials, mean / trials) : poissonSample(random, mean));
    let alarms = 0;
    for (let r = 0; r < REPEATS; r++) if (experiment(random, draw, trials, 400, order).p <= 0.05) alarms++;
    // At a true 7 % more than 18 of 150 come once in 100.
    expect(alarms).toBeLessThanOrEqual(Math.round(0.07 * REPEATS));
  });

  it('sees an excess of 60 % nearly always', () => {
    const random = generator(78, 1);
    let seen = 0;
    for (let r = 0; r < 40; r++) {
      const { counts } = betaBinomial(random, 400, 31, 0.15, 0.02);
      const shots = counts.flatMap(([n, h]) => Array.from({ length: h }, () => n));
      let next = 0;
      if (experiment(random, () => shots[next++], 31, 400, 3).p <= 0.05) seen++;
    }
    expect(seen).toBeGreaterThan(35);
  });
});
