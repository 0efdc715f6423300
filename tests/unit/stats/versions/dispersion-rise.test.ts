import { shotsOf } from '$lib/stats/calibration/shots-of';
import { betaBinomial } from '$lib/stats/calibration/violations/common-cause';
import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator, type Generator } from '$lib/stats/random/generator';
import { histogramSampler } from '$lib/stats/random/histogram-sampler';
import { dispersionRise, type VersionCounts } from '$lib/stats/versions/dispersion-rise';
import { describe, expect, it } from 'vitest';

/** Draws versions of equal trials: 64 of them with `mean` in all. */
function equalTrials(mean: number): (random: Generator, shots: number) => VersionCounts {
  const { first, values } = binomialWindow(64, mean / 64, 1e-18, 1);
  const sampler = histogramSampler(values);
  const into = new Float64Array(values.length);
  return (random, shots) => {
    sampler.draw(random, shots, into);
    const rows = Array.from(into, (h, i): [number, number] => [first + i, h]);
    return { counts: rows.filter(([, h]) => h > 0), trials: 64 };
  };
}

describe('dispersionRise', () => {
  it.each([
    [0.3, 0.3, 200, 200],
    [0.3, 0.3, 5000, 200],
    [0.3, 20, 200, 5000],
    [5, 1, 5000, 200],
    [20, 5, 1000, 1000],
    [5, 5, 5000, 5000]
  ])('holds 5 % at means %d and %d, %i and %i shots', (mean, mean0, shots, shots0) => {
    const [version, reference] = [equalTrials(mean), equalTrials(mean0)];
    let alarms = 0;
    for (let run = 0; run < 2000; run++) {
      const random = generator(41, run);
      const rise = dispersionRise(version(random, shots), reference(random, shots0));
      if (rise && rise.p <= 0.05) alarms++;
    }
    // At most 7 % wanted; 2000 runs have a standard deviation of 0.5 %.
    expect(alarms / 2000).toBeLessThanOrEqual(0.07);
    expect(alarms / 2000).toBeGreaterThan(0.02);
  });

  it('sees a common cause that adds 0.15 of the ceiling at 5000 shots, and not the other way round', () => {
    let [up, down] = [0, 0];
    for (let run = 0; run < 40; run++) {
      const random = generator(42, run);
      // 1 + 63·0.0024 = 1.15.
      const { counts } = betaBinomial(random, 5000, 64, 0.15, 0.0024);
      const plain = shotsOf(5000, () => binomialSample(random, 64, 0.1)).counts;
      const [crossed, reference] = [counts, plain].map((rows) => ({ counts: rows, trials: 64 }));
      if (dispersionRise(crossed, reference)!.p <= 0.01) up++;
      if (dispersionRise(reference, crossed)!.p <= 0.5) down++;
    }
    expect(up).toBeGreaterThanOrEqual(36);
    expect(down).toBe(0);
  });

  it('has nothing to say where the counts do not vary', () => {
    const flat: VersionCounts = { counts: [[3, 100]], trials: 64 };
    const other: VersionCounts = { counts: [[3, 50], [4, 50]], trials: 64 }; // prettier-ignore
    expect(dispersionRise(flat, other)).toBeNull();
    expect(dispersionRise(other, flat)).toBeNull();
    expect(dispersionRise(other, other)).toMatchObject({ factor: 1, z: 0 });
  });
});
