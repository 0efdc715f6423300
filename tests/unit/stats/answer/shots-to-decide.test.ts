import { shotsToDecide, type Deciding } from '$lib/stats/answer/shots-to-decide';
import { dispersionShape } from '$lib/stats/answer/smallest-excess';
import { describe, expect, it } from 'vitest';

const deciding = (value: number, over: Partial<Deciding> = {}): Deciding => ({
  shape: dispersionShape(4, 20),
  shots: 100,
  dispersion: { value, low: null, high: null },
  tolerance: 0.1,
  alpha: 0.01,
  tests: 6,
  ...over
});
const shape = dispersionShape(4, 20)!;

describe('shotsToDecide', () => {
  it('at or below the ceiling: what brings the upper limit under the tolerance in four of five repeats', () => {
    const want = Math.ceil(shape * ((1.96 + 0.842) / 0.1) ** 2);
    expect(shotsToDecide(deciding(1))).toBe(want);
    expect(shotsToDecide(deciding(0.6))).toBe(want);
  });

  it('far above the ceiling: what shows the excess at α shared among the tests', () => {
    // z(0.01/6) = 2.935 (R 4.2, qnorm(1 - 0.01/6) = 2.935199).
    expect(shotsToDecide(deciding(1.5))).toBe(Math.ceil(shape * ((2.935199 + 0.842) / 0.5) ** 2));
    // Fewer tests, fewer shots.
    const few = { shots: 10 };
    expect(shotsToDecide(deciding(1.5, { ...few, tests: 1 }))!).toBeLessThan(
      shotsToDecide(deciding(1.5, few))!
    );
  });

  it('in between: the nearer of the two, and most where they meet', () => {
    const at = [1, 1.02, 1.05, 1.08, 1.2, 1.5].map((value) => shotsToDecide(deciding(value))!);
    expect(Math.max(...at)).toBe(Math.max(at[2], at[3]));
    expect(at[1]).toBeGreaterThan(at[0]);
    expect(at[4]).toBeGreaterThan(at[5]);
  });

  it('asks for twice as many where more were taken and still did not decide', () => {
    expect(shotsToDecide(deciding(1, { shots: 1e6 }))).toBe(2e6);
  });

  it('is never under 50, and null where there is nothing to compare', () => {
    expect(shotsToDecide(deciding(15, { shots: 3 }))).toBe(50);
    expect(shotsToDecide(deciding(1, { shape: dispersionShape(0, 20) }))).toBeNull();
    expect(shotsToDecide({ ...deciding(1), dispersion: { value: null, low: null, high: null } })).toBeNull();
  });
});
