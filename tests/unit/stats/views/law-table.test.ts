import { logPmf } from '$lib/stats/laws/log-pmf';
import { tilt } from '$lib/stats/laws/tilt';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { logBinomialTail } from '$lib/stats/numerics/log-binomial-tail';
import { lawTable } from '$lib/stats/views/law-table';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';
import { anyProbability, lawOf, relative } from '../laws/enumerate';

const tenth = { levels: [{ p: 0.1, trials: 100 }], poissonPart: 0 };
const seen = dataOf({ shots: [0, 0, 3, 9, 20, 30, 20, 9], trials: 100 });

describe('lawTable', () => {
  it('gives the published check of Bin(100, 0.1), n ≥ 20', () => {
    const table = lawTable(seen, tenth);
    // Exact tail and the lattice form of Bahadur & Rao 1960 (m), recomputed with mpmath: 0.001978561, 0.002117018.
    expect(table.upper(20)).toBeCloseTo(0.001978561, 9);
    const { theta, exponent, law } = tilt(tenth, 20)!;
    const { variance } = lawMoments(law);
    const corrected = Math.exp(exponent) / ((1 - Math.exp(-theta)) * Math.sqrt(2 * Math.PI * variance));
    expect(corrected).toBeCloseTo(0.002117018, 9);
  });

  it('has tails that agree with the incomplete beta function, down to 1e-300', () => {
    const table = lawTable(seen, { levels: [{ p: 0.01, trials: 140 }], poissonPart: 0 });
    for (let n = 0; n <= 140; n += 10) {
      const high = logBinomialTail('high', n, 140, 0.01);
      if (high > -690) expect(Math.abs(Math.log(table.upper(n)) - high)).toBeLessThan(1e-10);
      const low = logBinomialTail('low', n, 140, 0.01);
      expect(Math.abs(Math.log(table.lower(n)) - low)).toBeLessThan(1e-10);
    }
  });

  it('has tails that add up: P(X ≥ n) + P(X ≤ n − 1) = 1, P(X ≥ n) − P(X ≥ n+1) = f_n', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 40 }), (p) => {
        const table = lawTable(dataOf({ shots: [1, 1], trials: p.length }), lawOf(p));
        expect(table.first).toBe(0);
        expect(table.f).toHaveLength(p.length + 1);
        for (let n = 0; n <= p.length; n++) {
          expect(table.upper(n) + table.lower(n - 1)).toBeCloseTo(1, 12);
          expect(table.upper(n) - table.upper(n + 1)).toBeCloseTo(table.f[n], 12);
          expect(table.upper(n)).toBeLessThanOrEqual(1);
        }
        expect(table.upper(p.length + 1)).toBe(0);
        expect(table.lower(-1)).toBe(0);
      }),
      { numRuns: 60 }
    );
  });

  it('keeps ln f_n where f_n underflows', () => {
    const law = { levels: [{ p: 1e-9, trials: 50 }], poissonPart: 0 };
    const table = lawTable(dataOf({ shots: [9, 1], trials: 50 }), law);
    expect(table.f[50]).toBeLessThan(1e-300);
    expect(relative(table.logF[50], 50 * Math.log(1e-9))).toBeLessThan(1e-13);
    expect(table.logF[40]).toBe(logPmf(law, 40));
  });

  it('shows every count up to N = 60, beyond that those seen and nine standard deviations', () => {
    const few = lawTable(dataOf({ shots: [5, 9, 2], trials: 60 }), {
      levels: [{ p: 0.01, trials: 60 }],
      poissonPart: 0
    });
    expect([few.first, few.f.length]).toEqual([0, 61]);
    // Bin(400, ½): mean 200, σ 10.
    const shots = [...new Array<number>(195).fill(0), 20, 30, 10];
    const many = lawTable(dataOf({ shots, trials: 400 }), {
      levels: [{ p: 0.5, trials: 400 }],
      poissonPart: 0
    });
    expect([many.first, many.first + many.f.length - 1]).toEqual([109, 291]);
    // A count seen far out is shown too, and the lump's first count.
    const far = lawTable(
      dataOf({
        shots: [...shots, ...new Array<number>(150).fill(0), 1],
        trials: 400,
        lump: { from: 360, shots: 1 }
      }),
      { levels: [{ p: 0.5, trials: 400 }], poissonPart: 0 }
    );
    expect(far.first + far.f.length - 1).toBe(361);
  });
});
