import { lawDraws } from '$lib/stats/calibration/law-draws';
import { bestLaw } from '$lib/stats/fit/best-law';
import { fitData } from '$lib/stats/fit/fit-data';
import { generator } from '$lib/stats/random/generator';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { tally } from '$lib/stats/demo/tally';
import { divergence } from '$lib/stats/resampling/divergence';
import { divergenceLimit } from '$lib/stats/versions/divergence-limit';
import type { Histogram } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

describe('the limit of a divergence', () => {
  it('far below a reference that shows nothing is that of χ²', () => {
    // χ² of 5 degrees of freedom exceeds 18.205 with a chance of 0.0027: R's qchisq(0.0027, 5, lower.tail = FALSE).
    const chance = 5 / 2000;
    const near = divergenceLimit(
      { shots: 1e9, corrected: 0, chance: 5e-10, error: 0 },
      { shots: 1000, chance }
    );
    expect(near).toBeCloseTo(18.205 / 2000 - chance, 6);
  });

  it('of a far reference is wider by its error and that of the version, and leans to the right', () => {
    const reference = { shots: 5000, corrected: 0.5, chance: 1e-4, error: 0.01 };
    const at = (shots: number) => divergenceLimit(reference, { shots, chance: 0.5 / shots });
    expect(at(5000)).toBeGreaterThan(0.5 + 2.78 * 0.01 * Math.SQRT2);
    expect(at(5000)).toBeLessThan(0.5 + 2.78 * 0.01 * Math.SQRT2 * 1.1);
    // √((1 + 25)/2) = 3.6, and a little more by the lean.
    expect(at(200) - 0.5).toBeGreaterThan(3.6 * (at(5000) - 0.5));
  });

  it('is exceeded by few versions of the law of the reference, and by most of a clearly bunched one', () => {
    const [equal, bunched] = [
      drawnFrom(lawDraws({ levels: [{ p: 0.15, trials: 12 }], poissonPart: 0 })),
      drawnFrom(beta)
    ];
    const above = (reference: Known[], versions: Known[]) =>
      reference.flatMap((one) =>
        versions.filter((two) => one !== two && two.corrected > divergenceLimit(one, two))
      ).length /
      (reference.length * versions.length);
    // 0.27 % wanted; of 200 draws 0.0027 ± 0.0037, so that 1.5 % is more than three errors away.
    expect(above(equal, equal)).toBeLessThan(0.015);
    expect(above(bunched, bunched)).toBeLessThan(0.015);
    expect(above(equal, bunched)).toBeGreaterThan(0.9);
  });
});

interface Known {
  shots: number;
  corrected: number;
  chance: number;
  error: number;
}

const SHOTS = 1000;
/** Beta-binomial counts of 12 trials, correlation 0.05 of any two. */
const beta = (random: ReturnType<typeof generator>, shots: number): Histogram => ({
  kind: 'histogram',
  counts: tally(
    Array.from({ length: shots }, () => binomialSample(random, 12, betaSample(random, 19 * 0.15, 19 * 0.85)))
  ),
  lump: null
});

/** 200 histograms with their divergences; chance and error as simulated for these laws, 2.9e-3 and √(2D + chance)/√S. */
function drawnFrom(draw: (random: ReturnType<typeof generator>, shots: number) => Histogram): Known[] {
  const chance = 2.9e-3;
  return Array.from({ length: 200 }, (_, i) => {
    const data = fitData(draw(generator(5, i), SHOTS), 12);
    const plugIn = divergence(data, bestLaw(data).logLikelihood);
    return {
      shots: SHOTS,
      corrected: plugIn - chance,
      chance,
      error: Math.sqrt((2 * plugIn + chance) / SHOTS)
    };
  });
}
