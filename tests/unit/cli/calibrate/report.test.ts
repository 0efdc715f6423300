import { expect, it } from 'vitest';
import type { Outcome } from '$lib/stats/calibration/outcome';
import { summary } from '$lib/stats/calibration/summary';
import { reportTogether, reportTruths } from '../../../../src/cli/calibrate/report';

const quiet: Outcome = {
  p: { fit: 0.5 },
  ruledOutFrom: 1,
  verdict: 'compatible',
  flagged: false,
  covered: null
};
const loud: Outcome = { ...quiet, p: { fit: 0.01 }, ruledOutFrom: 0.05 };
const outcomes = (alarms: number, of: number) =>
  Array.from({ length: of }, (_, i) => (i < alarms ? loud : quiet));

it('marks a share whose whole exact interval lies above its limit, and only then', () => {
  // 24 of 200: interval 7.84 … 17.3 %, above 7 %; 20 of 200: 6.22 … 15.0 % (R 4.2.2, binom.test).
  const [, above, within] = reportTruths([
    summary('a', 300, outcomes(24, 200)),
    summary('b', 300, outcomes(20, 200))
  ])
    .split('\n')
    .map((line) => line.split(/ {2,}/));
  expect(above[3]).toBe('12.0!');
  expect(within[3]).toBe('10.0');
});

it('adds the repeats of all settings up, and names the highest', () => {
  const text = reportTogether([summary('a', 300, outcomes(1, 100)), summary('b', 3000, outcomes(8, 100))]);
  expect(text).toMatch(/^fit +9 +200 +4\.50 +2\.\d\d to 8\.\d\d +8\.0 of 100, b, 3000 shots$/m);
});
