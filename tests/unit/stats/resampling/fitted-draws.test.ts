import { bestLaw } from '$lib/stats/fit/best-law';
import { refit } from '$lib/stats/fit/refit';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { lawWindow } from '$lib/stats/laws/law-window';
import { generator } from '$lib/stats/random/generator';
import { divergencesKept, fittedDraws } from '$lib/stats/resampling/fitted-draws';
import { redraw } from '$lib/stats/resampling/redraw';
import { refitted } from '$lib/stats/resampling/refitted';
import { stream } from '$lib/stats/resampling/streams';
import { describe, expect, it } from 'vitest';
import { dataOf, type Problem } from '../fit/plain';

const problems: { name: string; problem: Problem }[] = [
  { name: 'an ordinary histogram', problem: { shots: [30, 200, 500, 600, 400, 180, 66, 16, 6], trials: 12 } },
  { name: 'a lump', problem: { shots: [30, 60, 40, 12], trials: 9, lump: { from: 4, shots: 9 } } },
  { name: 'N unknown', problem: { shots: [175, 195, 90, 28, 10, 2], trials: null } }
];

describe.each(problems)('fittedDraws of $name', ({ problem }) => {
  const data = dataOf(problem);
  const { levels, logLikelihood } = bestLaw(data);
  const draws = fittedDraws({ data, levels, logLikelihood, seed: 4 });
  const source = redraw(lawWindow(toLaw(levels), 1e-18, 1), data, data.total);
  const all = 2 ** draws.questions.length - 1;
  // From `divergencesKept` on no divergence is kept, so that refits are left out or ended early.
  const later = Array.from({ length: 150 }, (_, i) => divergencesKept + i);

  it('answers as whole refits do, though most of them end early or are left out', () => {
    const reached = new Set<string>();
    for (const b of later) {
      const whole = refitted(source.draw(generator(4, stream('fitted law', b))), levels);
      const { exceeds } = draws.draw(b, all);
      draws.questions.forEach(({ id, statistic, bar }, i) => {
        const want = statistic.of(whole) >= bar;
        expect((exceeds & (1 << i)) !== 0, `${id}, draw ${b}`).toBe(want);
        reached.add(`${id} ${want}`);
      });
    }
    // Both answers come, or the comparison would show nothing.
    expect(reached.has('fit true') && reached.has('fit false')).toBe(true);
  });

  it('answers the same one by one, in any order, and leaves out what is not asked', () => {
    const together = later.map((b) => draws.draw(b, all).exceeds);
    const backward = [...later].reverse().map((b) => draws.draw(b, all).exceeds);
    expect(backward.reverse()).toEqual(together);
    draws.questions.forEach((_, i) => {
      expect(later.map((b) => draws.draw(b, 1 << i).exceeds)).toEqual(
        together.map((bits) => bits & (1 << i))
      );
    });
  });

  it('keeps the divergence of the first draws from whole refits', () => {
    const resample = source.draw(generator(4, stream('fitted law', divergencesKept - 1)));
    expect(draws.draw(divergencesKept - 1, 0).divergence).toBe(refitted(resample, levels).divergence);
    expect(draws.draw(divergencesKept, all).divergence).toBeNull();
  });

  it('rests on refits that stop as soon as they are told that all is settled', () => {
    let ended = 0;
    for (const b of later.slice(0, 20)) {
      const resample = source.draw(generator(4, stream('fitted law', b)));
      const whole = refit(resample, levels).logLikelihood;
      const early = refit(resample, levels, undefined, -Infinity).logLikelihood;
      expect(early).toBeLessThanOrEqual(whole + 1e-9);
      if (early < whole - 1e-9) ended++;
    }
    expect(ended).toBeGreaterThan(5);
  });
});
