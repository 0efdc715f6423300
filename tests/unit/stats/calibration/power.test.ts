import { describe, expect, it } from 'vitest';
import type { PName } from '$lib/stats/calibration/outcome';
import { repeat } from '$lib/stats/calibration/repeat';
import { violationSetting } from '$lib/stats/calibration/setting';
import { summary, type Summary } from '$lib/stats/calibration/summary';
import { violations } from '$lib/stats/calibration/violations';
import { highest, lowest } from './binomial-limits';

/** The small, fixed-seed edition of the power tables of `npm run calibrate`. */
async function measure(id: string, strength: number, shots: number, repeats: number): Promise<Summary> {
  const setting = violationSetting(
    violations.find((violation) => violation.id === id)!,
    strength
  );
  const outcomes = [];
  for (let index = 0; index < repeats; index++) {
    outcomes.push(await repeat(setting, shots, index, { resamples: 99, full: 199, alpha: 0.05, seed: 1 }));
  }
  return summary(setting.id, shots, outcomes);
}

describe('the smallest excess', () => {
  it.each([300, 3000])(
    'is seen by the ceiling test in about 80 of 100 repeats of %i shots',
    async (shots) => {
      const { alarms } = await measure('smallest-excess', 1, shots, 100);
      expect(alarms.ceiling!.hits).toBeGreaterThanOrEqual(lowest(100, 0.8));
      expect(alarms.ceiling!.hits).toBeLessThanOrEqual(highest(100, 0.8));
    },
    120_000
  );
});

describe('known violations at 3000 shots', () => {
  const repeats = 16;
  const seen: [id: string, strength: number, by: PName[], not: PName[]][] = [
    ['common-cause', 0.004, ['ceiling', 'high-tail', 'low-tail', 'fit'], []],
    ['neighbours', 0.06, ['ceiling', 'high-tail'], ['parity']],
    ['two-settings', 0.02, ['ceiling', 'high-tail', 'low-tail'], ['parity']],
    ['bursts', 0.002, ['high-tail', 'fit', 'certificate'], ['low-tail', 'parity', 'empty-shots']],
    ['dead-shots', 0.01, ['empty-shots', 'low-tail', 'fit'], ['high-tail']],
    ['pair-loss', 0.8, ['parity', 'fit', 'ceiling'], []],
    ['ring-pairs', 0.3, ['parity'], []],
    ['drift', 0.2, ['batches', 'order', 'ceiling'], ['parity', 'empty-shots']]
  ];

  it.each(seen)(
    '%s %d is seen by the tests that are meant to, and hardly by those that are not',
    async (id, strength, by, not) => {
      const { alarms, ruledOut, compatible } = await measure(id, strength, 3000, repeats);
      // Nine in ten at least; limits are quantiles of a binomial law, so 16 repeats may miss a few.
      for (const name of by) expect(alarms[name]!.hits, name).toBeGreaterThanOrEqual(lowest(repeats, 0.9));
      for (const name of not)
        expect(alarms[name]?.hits ?? 0, name).toBeLessThanOrEqual(highest(repeats, 0.1));
      expect(ruledOut['0.05'].hits).toBeGreaterThanOrEqual(lowest(repeats, 0.9));
      expect(compatible.hits).toBeLessThanOrEqual(highest(repeats, 0.05));
    },
    120_000
  );
});
