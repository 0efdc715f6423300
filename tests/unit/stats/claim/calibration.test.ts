import { lawDraws } from '$lib/stats/calibration/law-draws';
import { carefulThird } from '$lib/stats/claim/careful-third';
import { judgeClaim } from '$lib/stats/claim/judge-claim';
import { thirdOverMean } from '$lib/stats/claim/third-over-mean';
import { momentIntervals } from '$lib/stats/moments/moment-intervals';
import { generator } from '$lib/stats/random/generator';
import { normalSample } from '$lib/stats/random/normal-sample';
import type { Interval, Law } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';

/** Fitted laws are few levels; these are an equal one, a spread one, and a thin one whose far shots are rare. */
const LAWS: [name: string, law: Law, trials: number | null][] = [
  ['twelve equal trials', { levels: [{ p: 0.3, trials: 12 }], poissonPart: 0 }, 12],
  [
    'two kinds of trials',
    {
      levels: [
        { p: 0.08, trials: 40 },
        { p: 0.6, trials: 8 }
      ],
      poissonPart: 0
    },
    48
  ],
  ['rare events', { levels: [], poissonPart: 0.5 }, null]
];
const REPEATS = 500;
const NAMES = ['mean', 'variance', 'third', 'fano', 'third-over-mean'] as const;

describe.each([600, 4000])('claims held to %i shots', (shots) => {
  it.each(LAWS)(
    '%s: right claims are seldom called wrong, claims 5 σ off are caught',
    (_name, law, trials) => {
      const truth = truths(law);
      const draw = lawDraws(law);
      const wrong = { 0.95: counter(), 0.99: counter() };
      const fuzzy = counter();
      const caught = counter();
      for (let i = 0; i < REPEATS; i++) {
        const random = generator(77, shots * 1000 + i);
        const data = dataOf(draw(random, shots).counts, shots, trials, i);
        for (const name of NAMES) {
          const { value, low, high } = data[name];
          const u = (high! - low!) / 2 / 1.959964;
          const rules = { level: 0.99, matters: Infinity };
          for (const level of [0.95, 0.99] as const) {
            const exact = judgeClaim(data[name], { value: truth[name], sigma: 0 }, { ...rules, level });
            if (exact.verdict === 'disagrees') wrong[level][name]++;
          }
          // A claim with an error of its own, as large as the data's.
          const claimed = { value: truth[name] + u * normalSample(random), sigma: u };
          if (judgeClaim(data[name], claimed, rules).verdict === 'disagrees') fuzzy[name]++;
          const side = i % 2 ? high! - value! : low! - value!;
          const off = truth[name] + (5 * side) / 1.959964;
          if (judgeClaim(data[name], { value: off, sigma: 0 }, rules).verdict === 'disagrees') caught[name]++;
        }
      }
      for (const name of NAMES) {
        // Nominal shares and what 500 repeats scatter about them, 3.1 standard errors (one in a thousand).
        expect(wrong[0.95][name], `${name} at 95 %`).toBeLessThanOrEqual(most(0.05));
        expect(wrong[0.99][name], `${name} at 99 %`).toBeLessThanOrEqual(most(0.01));
        expect(fuzzy[name], `${name}, claim with an error`).toBeLessThanOrEqual(most(0.01));
        // P(Z < 5 − 2.576) = 0.992; the interval, with errors that differ from sample to sample, comes near.
        expect(caught[name] / REPEATS, `${name}, 5 σ off`).toBeGreaterThan(0.97);
      }
    }
  );
});

const counter = (): Record<(typeof NAMES)[number], number> => ({
  mean: 0,
  variance: 0,
  third: 0,
  fano: 0,
  'third-over-mean': 0
});

const most = (share: number): number => REPEATS * share + 3.1 * Math.sqrt(REPEATS * share * (1 - share));

function dataOf(
  counts: [number, number][],
  shots: number,
  trials: number | null,
  seed: number
): Record<(typeof NAMES)[number], Interval> {
  const moments = momentIntervals(counts, trials, { resamples: 399, seed });
  const third = carefulThird(moments.third, shots);
  const ratio = thirdOverMean({ ...moments, third }, shots);
  return {
    mean: moments.mean,
    variance: moments.variance,
    third,
    fano: moments.fano,
    'third-over-mean': ratio
  };
}

function truths(law: Law): Record<(typeof NAMES)[number], number> {
  const [first, second, third] = [1, 2, 3].map((order) => cumulant(law, order));
  return { mean: first, variance: second, third, fano: second / first, 'third-over-mean': third / first };
}

/** κ1 … κ3 of one trial are p, p(1 − p), p(1 − p)(1 − 2p); of rare events all are their mean. */
function cumulant({ levels, poissonPart }: Law, order: number): number {
  return levels.reduce((sum, { p, trials }) => {
    const of = [p, p * (1 - p), p * (1 - p) * (1 - 2 * p)][order - 1];
    return sum + trials * of;
  }, poissonPart);
}
