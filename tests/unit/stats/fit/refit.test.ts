import { bestLaw } from '$lib/stats/fit/best-law';
import { refit } from '$lib/stats/fit/refit';
import { climb } from '$lib/stats/fit/climb';
import { workspace } from '$lib/stats/fit/workspace';
import { describe, expect, it } from 'vitest';
import { dataOf, plainLogLikelihood, levelsOf, probabilities } from './plain';
import { refitCases } from './refits';

describe.each(['weldon12', 'lz32'] as const)('refit of resamples of %s', (name) => {
  const { trials, observed, refits } = refitCases[name];
  const from = bestLaw(dataOf({ shots: observed, trials })).levels;

  it('comes within 1e-3 nats of the best known, all forty', () => {
    const short = refits.map(
      ({ shots, best }) => best - refit(dataOf({ shots, trials }), from).logLikelihood
    );
    expect(short.filter((missing) => !(missing < 1e-3))).toEqual([]);
    // And not by another likelihood: nothing can be better than the best of many starts by more than rounding.
    expect(Math.min(...short)).toBeGreaterThan(-1e-4);
  });

  it('reports the likelihood and the pmf of the levels it returns', () => {
    for (const { shots } of refits.slice(0, 5)) {
      const { levels, logLikelihood, window } = refit(dataOf({ shots, trials }), from);
      const p = probabilities(levels);
      expect(p).toHaveLength(trials);
      expect(Math.abs(logLikelihood - plainLogLikelihood({ shots, trials }, p))).toBeLessThan(1e-7);
      const total = window.values.reduce((sum, value) => sum + value, 0) / window.scale;
      expect(total).toBeCloseTo(1, 12);
    }
  });
});

describe('refit', () => {
  it('leaves the saddle of equal levels, on which Newton steps alone stay', () => {
    const { trials, observed, refits } = refitCases.weldon12;
    const from = bestLaw(dataOf({ shots: observed, trials })).levels;
    expect(from.p).toHaveLength(1);
    const trapped = refits.filter(({ shots, best }) => {
      const space = workspace(dataOf({ shots, trials }));
      return climb(space, from, 1e-9).value < best - 0.01;
    });
    // About half of the resamples want uneven trials; a start that cannot see it would bias every p-value.
    expect(trapped.length).toBeGreaterThan(10);
  });

  it('starts afresh when the law drawn from forbids a count', () => {
    const data = dataOf({ shots: [5, 20, 9, 1], trials: 3 });
    const forbids = levelsOf([[0.4, 2]], { ones: 1 });
    const best = bestLaw(data).logLikelihood;
    expect(refit(data, forbids).logLikelihood).toBeGreaterThan(best - 1e-3);
  });
});
