import { bestLaw } from '$lib/stats/fit/best-law';
import { divergencesKept, fittedDraws, type FittedJob } from '$lib/stats/resampling/fitted-draws';
import { rangeAnswerer } from '$lib/stats/resampling/range-answerer';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';

function jobOf(shots: number[], trials: number | null): FittedJob {
  const data = dataOf({ shots, trials });
  const { levels, logLikelihood } = bestLaw(data);
  return { data, levels, logLikelihood, seed: 11 };
}

describe('rangeAnswerer', () => {
  it('answers as fittedDraws does, through a clone, and keeps the job', () => {
    const answer = rangeAnswerer();
    // N unknown: its zeros are infinite, which a clone keeps and JSON would not.
    for (const job of [jobOf([40, 90, 70, 30, 9], 8), jobOf([175, 195, 90, 28, 10, 2], null)]) {
      const draws = fittedDraws(job);
      const start = divergencesKept - 4;
      const want = Array.from({ length: 12 }, (_, i) => draws.draw(start + i, 7));
      const range = (from: number, to: number) => ({ from, to, wanted: 7 });
      const first = answer(structuredClone({ job, range: range(start, start + 7) }));
      expect([...first, ...answer({ job: null, range: range(start + 7, start + 12) })]).toEqual(want);
      expect(new Set(want.map(({ divergence }) => divergence === null)).size).toBe(2);
    }
  });

  it('refuses to answer for no job', () => {
    expect(() => rangeAnswerer()({ job: null, range: { from: 0, to: 1, wanted: 1 } })).toThrow('no job yet');
  });
});
