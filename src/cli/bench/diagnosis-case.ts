import { readRefitCase } from './refit-case';
import { landauZenerLevels } from '$lib/stats/demo/landau-zener-levels';
import { tally } from '$lib/stats/demo/tally';
import { lawDraws } from '$lib/stats/calibration/law-draws';
import { betaSample } from '$lib/stats/random/beta-sample';
import { binomialSample } from '$lib/stats/random/binomial-sample';
import { generator } from '$lib/stats/random/generator';
import type { Histogram } from '$lib/stats/types';

/** A whole diagnosis to be timed, and what it may take. */
export interface DiagnosisCase {
  id: string;
  trials: number;
  histogram(): Histogram;
  /** Seconds that it may take, as the engine promises. */
  limit: number;
}

/** Modes of a ramp; the data are as good as independent, and resampling ends early. */
function modes(trials: number, slowness: number, shots: number, limit: number): DiagnosisCase {
  const law = { levels: landauZenerLevels(2 * trials, slowness), poissonPart: 0 };
  return {
    id: `landau-zener-${trials}`,
    trials,
    histogram: () => lawDraws(law)(generator(7, trials), shots),
    limit
  };
}

/**
 * The same, with a burst: `extra` more shots at the count above the largest. With one in 2000 the tail is as clear as
 * can be; with two or three the answer hangs on it, and every one of the resamples must be drawn and refitted.
 */
function burst(of: DiagnosisCase, extra: number, id = `burst-${of.trials}`): DiagnosisCase {
  return {
    ...of,
    id,
    histogram: () => {
      const { counts } = of.histogram();
      const high = counts[counts.length - 1][0] + 1;
      return { kind: 'histogram', counts: [...counts, [high, extra]], lump: null };
    }
  };
}

/** Beta-binomial counts with half as much variance again: every test takes all its draws. */
function bunched(trials: number, p: number, shots: number, limit: number): DiagnosisCase {
  const weight = 2 * (trials - 1) - 1;
  return {
    id: `bunched-${trials}`,
    trials,
    histogram: () => {
      const random = generator(8, trials);
      const counts = Array.from({ length: shots }, () =>
        binomialSample(random, trials, betaSample(random, weight * p, weight * (1 - p)))
      );
      return { kind: 'histogram', counts: tally(counts), lump: null };
    },
    limit
  };
}

export const diagnosisCases: DiagnosisCase[] = [
  {
    id: 'weldon-12',
    trials: 12,
    histogram: () => {
      const { observed } = readRefitCase('weldon12');
      const counts = Array.from(observed.shots, (shots, i): [number, number] => [observed.first + i, shots]);
      return { kind: 'histogram', counts, lump: null };
    },
    limit: 0.3
  },
  burst(modes(12, 1, 5000, 0.3), 2, 'doubtful-12'),
  bunched(12, 0.3, 26_306, 0.3),
  modes(64, 2, 5000, 1.5),
  burst(modes(64, 2, 5000, 1.5), 3, 'doubtful-64'),
  bunched(64, 0.15, 5000, 1.5),
  modes(256, 4, 20_000, 10),
  burst(modes(256, 4, 20_000, 10), 3, 'doubtful-256'),
  bunched(256, 0.1, 20_000, 10),
  modes(2000, 8, 100_000, 10),
  burst(modes(2000, 8, 100_000, 10), 4, 'doubtful-2000'),
  burst(modes(2000, 8, 100_000, 10), 50),
  bunched(2000, 0.1, 100_000, 10)
];
