import { beforeAll, describe, expect, it } from 'vitest';
import { outcomeOf } from '$lib/stats/calibration/outcome';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { Diagnosis } from '$lib/stats/types';

let diagnosis: Diagnosis;

beforeAll(async () => {
  // Greenwood & Yule 1920, JRSS 83:255: 647 shells' workers by accidents, far over the Poisson ceiling.
  const counts: [number, number][] = [447, 132, 42, 21, 3, 2].map((seen, n) => [n, seen]);
  diagnosis = await diagnose({ kind: 'histogram', counts, lump: null }, { ...defaultOptions, resamples: 99 });
});

describe('outcomeOf', () => {
  it('takes p of every test that ran, the verdict, and the least α that rules out', () => {
    const { p, ruledOutFrom, verdict, flagged } = outcomeOf(diagnosis, null);
    expect(Object.keys(p)).toEqual([...diagnosis.tests.map(({ id }) => id), 'certificate']);
    expect(p.ceiling).toBe(0.01);
    const adjusted = diagnosis.tests.map(({ pAdjusted }) => pAdjusted);
    expect(ruledOutFrom).toBe(Math.min(...adjusted, diagnosis.tails.certificate!.p));
    expect(verdict).toBe(diagnosis.answer.verdict);
    expect(flagged).toBe(true);
  });

  it('compares each interval with the cumulants given', () => {
    const { mean, variance, third, fourth } = diagnosis.moments;
    const truth = {
      mean: mean.value!,
      variance: variance.high! + 1e-9,
      third: third.low!,
      fourth: fourth.low! - 1e-9
    };
    expect(outcomeOf(diagnosis, truth).covered).toEqual({
      mean: true,
      variance: false,
      third: true,
      fourth: false,
      dispersion: truth.variance / truth.mean <= diagnosis.moments.dispersion.high!
    });
  });
});
