import { oddCounts } from '$lib/stats/misread/odd-counts';
import { describe, expect, it } from 'vitest';

describe('oddCounts', () => {
  it('gives the share with its exact interval: 1 of 10, from the published tables', () => {
    const { share, faultyShots } = oddCounts(
      [
        [0, 4],
        [2, 5],
        [3, 1]
      ],
      20
    );
    expect(share.value).toBeCloseTo(0.1, 15);
    expect(share.low).toBeCloseTo(0.0025286, 7);
    expect(share.high).toBeCloseTo(0.445016, 6);
    expect(faultyShots.high).toBeCloseTo(0.890032, 5);
  });

  it('finds the chance that makes bonds fail: 3 bonds at 0.1, counted case by case', () => {
    // Odd with one failure or three: 3·0.1·0.81 + 0.001 = 0.244.
    const { faultyBonds } = oddCounts(
      [
        [2, 756],
        [1, 244]
      ],
      3
    );
    expect(faultyBonds.value).toBeCloseTo(0.1, 12);
    expect(faultyBonds.low!).toBeLessThan(0.1);
    expect(faultyBonds.high!).toBeGreaterThan(0.1);
  });

  it('says nothing of single bonds once half the shots are odd, and 0 when none is', () => {
    expect(
      oddCounts(
        [
          [0, 5],
          [1, 5]
        ],
        8
      ).faultyBonds.value
    ).toBeNull();
    const none = oddCounts([[0, 10]], 8);
    expect(none.faultyBonds.value).toBeCloseTo(0, 15);
    expect(none.share.high).toBeCloseTo(0.308497, 6);
  });
});
