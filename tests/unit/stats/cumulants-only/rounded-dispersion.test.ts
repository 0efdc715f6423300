import { ceiling } from '$lib/stats/bounds/ceiling';
import { roundedDispersion } from '$lib/stats/cumulants-only/rounded-dispersion';
import { generator } from '$lib/stats/random/generator';
import { expect, it } from 'vitest';

const half = (value: number, error: number) => ({ value, error, rounded: true as const });

it('holds all that numbers within the half units give, and no more', () => {
  const random = generator(12, 0);
  for (let table = 0; table < 200; table++) {
    const trials = table % 2 ? null : 2 + Math.floor(30 * random.next());
    const mean = half((0.2 + 0.6 * random.next()) * (trials ?? 5), 0.3 * random.next());
    const variance = half(mean.value * random.next() + 0.4, 0.3 * random.next());
    const found = roundedDispersion({ trials, mean, variance, third: null, fourth: null });
    const all: number[] = [];
    for (let i = -200; i <= 200; i++)
      for (const j of [-1, 1])
        all.push(
          (variance.value + j * variance.error) / ceiling(mean.value + (i / 200) * mean.error, trials)
        );
    expect(found.low! / Math.min(...all)).toBeCloseTo(1, 3);
    expect(found.high! / Math.max(...all)).toBeCloseTo(1, 3);
  }
});

it('has no high end where the mean may have been 0, and no value where it is', () => {
  const of = (mean: number) =>
    roundedDispersion({
      trials: 9,
      mean: half(mean, 0.5),
      variance: half(1, 0.5),
      third: null,
      fourth: null
    });
  expect(of(0.3).high).toBeNull();
  expect(of(0)).toEqual({ value: null, low: null, high: null });
});
