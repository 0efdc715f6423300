import { expect, it } from 'vitest';
import { lawDraws } from '$lib/stats/calibration/law-draws';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { generator } from '$lib/stats/random/generator';

it('draws histograms of the law: shots, mean and variance within five standard errors', () => {
  const law = {
    levels: [
      { p: 0.9, trials: 2 },
      { p: 0.2, trials: 10 }
    ],
    poissonPart: 0.5
  };
  const shots = 200_000;
  const { counts, lump } = lawDraws(law)(generator(3, 1), shots);
  expect(lump).toBeNull();
  expect(counts.reduce((sum, [, seen]) => sum + seen, 0)).toBe(shots);
  const { mean, variance, fourth } = lawMoments(law);
  const seenMean = counts.reduce((sum, [n, seen]) => sum + n * seen, 0) / shots;
  const seenVariance = counts.reduce((sum, [n, seen]) => sum + (n - seenMean) ** 2 * seen, 0) / shots;
  expect(Math.abs(seenMean - mean)).toBeLessThan(5 * Math.sqrt(variance / shots));
  expect(Math.abs(seenVariance - variance)).toBeLessThan(5 * Math.sqrt((fourth + 2 * variance ** 2) / shots));
});

it('draws the same histogram from the same stream, and another from another', () => {
  const draw = lawDraws({ levels: [{ p: 0.3, trials: 12 }], poissonPart: 0 });
  const first = draw(generator(3, 1), 500);
  expect(draw(generator(3, 1), 500)).toEqual(first);
  expect(draw(generator(3, 2), 500)).not.toEqual(first);
});
