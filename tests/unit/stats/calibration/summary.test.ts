import { expect, it } from 'vitest';
import type { Outcome } from '$lib/stats/calibration/outcome';
import { summary } from '$lib/stats/calibration/summary';

const covered = { mean: true, variance: true, third: false, fourth: true, dispersion: true };
const outcomes: Outcome[] = [
  // 20/400: exactly at the level, and so an alarm.
  {
    p: { fit: 20 / 400, 'empty-shots': 0.01 },
    ruledOutFrom: 0.01,
    verdict: 'ruled-out',
    flagged: true,
    covered
  },
  { p: { fit: 21 / 400 }, ruledOutFrom: 0.04, verdict: 'compatible', flagged: true, covered },
  {
    p: { fit: 1 },
    ruledOutFrom: 1,
    verdict: 'undecided',
    flagged: false,
    covered: { ...covered, mean: false }
  }
];

it('counts alarms of all repeats, also where a test had nothing to look at', () => {
  const { alarms, ruledOut, compatible, undecided, flagged, coverage } = summary('x', 300, outcomes);
  expect(alarms.fit).toMatchObject({ hits: 1, of: 3 });
  expect(alarms['empty-shots']).toMatchObject({ hits: 1, of: 3 });
  expect(alarms.order).toBeUndefined();
  expect(ruledOut['0.01'].hits).toBe(1);
  expect(ruledOut['0.05'].hits).toBe(2);
  expect([compatible.hits, undecided.hits, flagged.hits]).toEqual([1, 1, 2]);
  expect(coverage!.mean).toMatchObject({ hits: 2, of: 3 });
  expect(coverage!.third.hits).toBe(0);
});

it('has no coverage where there is no law to cover', () => {
  expect(summary('x', 300, [{ ...outcomes[0], covered: null }]).coverage).toBeNull();
});
