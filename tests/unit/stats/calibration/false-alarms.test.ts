import { beforeAll, describe, expect, it } from 'vitest';
import type { PName } from '$lib/stats/calibration/outcome';
import { repeat } from '$lib/stats/calibration/repeat';
import { truthSetting } from '$lib/stats/calibration/setting';
import { summary, type Summary } from '$lib/stats/calibration/summary';
import { truths } from '$lib/stats/calibration/truths';
import { highest, lowest } from './binomial-limits';

/**
 * The small, fixed-seed edition of `npm run calibrate`: whole diagnoses of true independent trials. Limits are
 * the 99.9 % quantiles of a binomial law at the share that must not be passed: at most 7 % for each test at a
 * nominal 5 %, the whole answer at most its α, intervals at least nearly their 95 %.
 */
const cells: [truth: string, shots: number, repeats: number][] = [
  ['equal-12', 300, 50],
  ['equal-64', 300, 50],
  ['spread-20', 300, 50],
  ['sparse-64', 300, 50],
  ['landau-zener-20', 300, 50],
  ['equal-unknown', 300, 50],
  ['sparse-unknown', 300, 50],
  ['equal-20', 3000, 50],
  ['spread-64', 3000, 50],
  ['sparse-20', 3000, 50],
  ['spread-20', 30_000, 50]
];
const resampled = ['ceiling', 'fit', 'high-tail', 'low-tail', 'parity', 'empty-shots'] as const;

let summaries: Summary[];

beforeAll(async () => {
  summaries = [];
  for (const [id, shots, repeats] of cells) {
    const setting = truthSetting(truths.find((truth) => truth.id === id)!);
    const outcomes = [];
    for (let index = 0; index < repeats; index++) {
      outcomes.push(await repeat(setting, shots, index, { resamples: 99, full: 199, alpha: 0.05, seed: 1 }));
    }
    summaries.push(summary(id, shots, outcomes));
  }
}, 300_000);

describe('false alarms', () => {
  it('of each test in each cell: not above 7 %', () => {
    for (const { setting, shots, alarms } of summaries) {
      for (const name of resampled) {
        const alarm = alarms[name];
        if (alarm)
          expect(alarm.hits, `${name}, ${setting}, ${shots}`).toBeLessThanOrEqual(highest(alarm.of, 0.07));
      }
    }
  });

  it('of each test over all cells: not above 7 %', () => {
    for (const name of resampled) {
      const { hits, of } = together(name);
      expect(of, name).toBeGreaterThan(300);
      expect(hits, name).toBeLessThanOrEqual(highest(of, 0.07));
    }
  });

  it('of fit and tails where counts are plentiful: not under 3 %, so the tests are not asleep', () => {
    const plentiful = summaries.filter(({ setting }) => /^(equal|spread)-/.test(setting));
    for (const name of ['fit', 'high-tail', 'low-tail'] as const) {
      const { hits, of } = together(name, plentiful);
      expect(hits, name).toBeGreaterThanOrEqual(lowest(of, 0.03));
      expect(lowest(of, 0.03)).toBeGreaterThan(1);
    }
  });

  it('of the ceiling: about 5 % under equal trials, none to speak of under uneven ones', () => {
    const equal = together(
      'ceiling',
      summaries.filter(({ setting }) => setting.startsWith('equal'))
    );
    expect(equal.hits).toBeGreaterThanOrEqual(lowest(equal.of, 0.05));
    const uneven = together(
      'ceiling',
      summaries.filter(({ setting }) => !setting.startsWith('equal'))
    );
    expect(uneven.hits).toBeLessThanOrEqual(highest(uneven.of, 0.01));
  });

  it('of the certificate: hardly any', () => {
    const { hits, of } = together('certificate');
    expect(hits).toBeLessThanOrEqual(highest(of, 0.005));
  });

  it('of the whole answer: at most its α', () => {
    for (const alpha of ['0.01', '0.05'] as const) {
      const hits = summaries.reduce((sum, { ruledOut }) => sum + ruledOut[alpha].hits, 0);
      const of = summaries.reduce((sum, { ruledOut }) => sum + ruledOut[alpha].of, 0);
      expect(hits, alpha).toBeLessThanOrEqual(highest(of, Number(alpha)));
    }
  });
});

describe('intervals', () => {
  it.each(['mean', 'dispersion'] as const)('of the %s hold the truth in 95 of 100 repeats', (name) => {
    const shares = summaries.map(({ coverage }) => coverage![name]);
    const hits = shares.reduce((sum, share) => sum + share.hits, 0);
    const of = shares.reduce((sum, share) => sum + share.of, 0);
    expect(hits).toBeGreaterThanOrEqual(lowest(of, 0.95));
    expect(hits).toBeLessThanOrEqual(highest(of, 0.98));
  });
});

/** Alarms of one test over all repeats of these cells in which it ran at all. */
function together(name: PName, of = summaries): { hits: number; of: number } {
  const shares = of.map(({ alarms }) => alarms[name]).filter((share) => share !== undefined);
  return {
    hits: shares.reduce((sum, share) => sum + share.hits, 0),
    of: shares.reduce((sum, share) => sum + share.of, 0)
  };
}
