import { trialsReport } from '$lib/stats/sensitivity/trials-report';
import { describe, expect, it } from 'vitest';

const around = (value: number, by: number) => ({ value, low: value * (1 - by), high: value * (1 + by) });

describe('trialsReport', () => {
  it('marks the N at which the ceiling equals the variance, worked by hand', () => {
    // Mean 4, variance 3: N* = 16/(4 − 3) = 16; at N = 16 the ceiling is 4(1 − 1/4) = 3.
    const found = trialsReport({ mean: around(4, 0.01), variance: around(3, 0.02) }, 10, 20, 0.1)!;
    expect(found.critical).toBe(16);
    const of = (trials: number | null) => found.points.find((point) => point.trials === trials)!;
    expect(of(16).ceiling).toBeCloseTo(3, 12);
    expect(of(16).dispersion.value).toBeCloseTo(1, 12);
    expect(of(20).dispersion.value).toBeCloseTo(3 / 3.2, 12);
    expect(of(10).standing).toBe('over');
    expect(of(16).standing).toBe('within');
    expect(of(null).dispersion.value).toBeCloseTo(0.75, 12);
    expect(found.statement).toMatch(/over its ceiling; from N = about 1\d on, .*equals it at N = 16/);
    const order = found.points.map(({ trials }) => trials ?? Infinity);
    expect(order).toEqual([...order].sort((a, b) => a - b));
  });
  it('says where no N rescues independence, and where none is needed', () => {
    expect(trialsReport({ mean: around(4, 0.01), variance: around(5, 0.02) }, 12, null, 0.1)).toMatchObject({
      critical: null,
      statement: expect.stringMatching(/every N.*No number of trials brings/) as string
    });
    const regular = trialsReport({ mean: around(4, 0.01), variance: around(1, 0.02) }, 8, 8, 0.1)!;
    expect(regular.statement).toMatch(
      /not over it by an excess that matters for every N.*No N that the counts allow/
    );
    expect(trialsReport({ mean: around(4, 0.01), variance: around(0, 0) }, 4, 8, 0.1)).toBeUndefined();
  });
});
