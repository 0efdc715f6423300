import { mixedCaution } from '$lib/stats/sweep/mixed-caution';
import { mixedConditions } from '$lib/stats/sweep/mixed-conditions';
import { describe, expect, it } from 'vitest';

const one = (device: string | null, firmware: string | null, group: string | null) => ({
  device,
  firmware,
  group
});

describe('a caution of conditions that differ', () => {
  it('is silent where all share them, or none states them', () => {
    for (const all of [[one('D', '1', 'a'), one('D', '1', 'a')], [one(null, null, null)], []])
      expect(mixedCaution(mixedConditions(all))).toEqual([]);
    // The first documents did not have them.
    expect(mixedCaution(undefined)).toEqual([]);
  });

  it('counts what differs, and who states none', () => {
    const all = [one('D', '1', 'a'), one('E', '2', 'a'), one('D', '3', 'a'), one('D', '1', null)];
    expect(mixedConditions(all)).toEqual([
      { of: 'device', stated: 2, unstated: 0 },
      { of: 'firmware', stated: 3, unstated: 0 },
      { of: 'group', stated: 1, unstated: 1 }
    ]);
    expect(mixedCaution(mixedConditions(all))[0]).toMatch(
      /^The datasets are of 2 devices, 3 firmware versions and 1 group \(1 states none\): /
    );
    expect(mixedCaution(mixedConditions([one('D', null, null), one('E', null, null)]))[0]).toMatch(
      /^The datasets are of 2 devices: /
    );
  });
});
