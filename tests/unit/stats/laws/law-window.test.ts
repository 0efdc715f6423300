import { newtonViolation } from '$lib/stats/bounds/newton-violation';
import { lawMoments } from '$lib/stats/laws/law-moments';
import { lawWindow } from '$lib/stats/laws/law-window';
import type { Window } from '$lib/stats/laws/window';
import type { Law } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { anyProbability, enumerate, innerProbability, lawOf, logRecurrence, relative } from './enumerate';
import { exactCases, packageCases } from './pmf-reference';

/** f_n of a window; divided before anything else, since a logarithm of the scale would cost three digits. */
function at({ first, values, scale }: Window, n: number): number {
  return n >= first && n < first + values.length ? values[n - first] / scale : 0;
}

function pmf(law: Law, last: number): number[] {
  const window = lawWindow(law);
  return Array.from({ length: last + 1 }, (_, n) => at(window, n));
}

describe('lawWindow against other computations', () => {
  it('equals the sum over all 2^N outcomes, N up to 10', () => {
    fc.assert(
      fc.property(fc.array(anyProbability, { minLength: 1, maxLength: 10 }), (p) => {
        const window = lawWindow(lawOf(p));
        enumerate(p).forEach((want, n) => {
          // Enumeration itself ends with the doubles.
          if (want > 1e-290) expect(relative(at(window, n), want), `count ${n}`).toBeLessThan(1e-13);
          if (want === 0) expect(at(window, n)).toBeLessThan(1e-290);
        });
      }),
      { numRuns: 200 }
    );
  });

  it('equals a recurrence in logarithms down to 1e-300, N up to 120', () => {
    fc.assert(
      fc.property(fc.array(innerProbability, { minLength: 1, maxLength: 120 }), (p) => {
        const window = lawWindow(lawOf(p));
        logRecurrence(p).forEach((want, n) => {
          if (want > -690) expect(Math.abs(Math.log(at(window, n)) - want), `count ${n}`).toBeLessThan(1e-10);
        });
      }),
      { numRuns: 60 }
    );
  });

  it('equals exact rational arithmetic to 1e-12 relative, down to 1e-300', () => {
    let deep = 0;
    for (const { name, p, poissonPart, pmf } of exactCases) {
      const window = lawWindow(lawOf(p, poissonPart));
      pmf.forEach((want, n) => {
        if (typeof want !== 'number') expect(at(window, n), `${name}, count ${n}`).toBeLessThan(1e-300);
        else expect(relative(at(window, n), want), `${name}, count ${n}`).toBeLessThan(1e-12);
        if (typeof want === 'number' && want > 0 && want < 1e-200) deep++;
      });
    }
    expect(deep).toBeGreaterThan(40);
  });

  it('equals dpbinom and ppbinom of R’s PoissonBinomial 1.2.5 to 1e-10', () => {
    for (const { kind, trials, p, pmf, cdf, above } of packageCases) {
      const window = lawWindow(lawOf(p));
      let below = 0;
      for (let n = 0; n <= trials; n++) {
        const name = `${kind} ${trials}, count ${n}`;
        const want = pmf[n];
        if (want !== null) expect(relative(at(window, n), want), name).toBeLessThan(1e-10);
        below += at(window, n);
        if (cdf[n] !== null) expect(relative(below, cdf[n]!), name).toBeLessThan(1e-10);
        let rest = 0;
        for (let k = trials; k > n; k--) rest += at(window, k);
        if (above[n] !== null) expect(relative(rest, above[n]!), name).toBeLessThan(1e-10);
      }
    }
  });

  it('gives the worked examples', () => {
    // Exact products; the four-trial one is worked in many introductions to the law.
    const first = pmf(lawOf([0.1, 0.2, 0.2]), 3);
    const second = pmf(lawOf([0.1, 0.6, 0.7, 0.8]), 4);
    [0.576, 0.352, 0.068, 0.004].forEach((want, n) => expect(first[n]).toBeCloseTo(want, 15));
    [0.0216, 0.1716, 0.4256, 0.3476, 0.0336].forEach((want, n) => expect(second[n]).toBeCloseTo(want, 15));
  });
});

describe('properties of every law', () => {
  const anyLaw = fc.record({
    levels: fc.array(fc.record({ p: anyProbability, trials: fc.integer({ min: 0, max: 40 }) }), {
      maxLength: 6
    }),
    poissonPart: fc.oneof(fc.constant(0), fc.double({ min: 0, max: 60, noNaN: true }))
  });

  it('sums to 1, with the mean and variance of its cumulants', () => {
    fc.assert(
      fc.property(anyLaw, (law) => {
        const { first, values, scale } = lawWindow(law);
        const moments = lawMoments(law);
        let [sum, mean, spread] = [0, 0, 0];
        values.forEach((value) => (sum += value / scale));
        values.forEach((value, k) => (mean += (first + k) * (value / scale)));
        values.forEach((value, k) => (spread += (first + k - mean) ** 2 * (value / scale)));
        expect(sum).toBeCloseTo(1, 12);
        expect(Math.abs(mean - moments.mean)).toBeLessThan(1e-12 * (1 + moments.mean));
        expect(Math.abs(spread - moments.variance)).toBeLessThan(1e-11 * (1 + moments.mean));
      })
    );
  });

  it('is binomial when all probabilities are equal', () => {
    fc.assert(
      fc.property(innerProbability, fc.integer({ min: 1, max: 60 }), (p, trials) => {
        const alone = pmf(lawOf(new Array<number>(trials).fill(p)), trials);
        const together = pmf({ levels: [{ p, trials }], poissonPart: 0 }, trials);
        alone.forEach((value, n) => expect(relative(value, together[n])).toBeLessThan(1e-12));
      }),
      { numRuns: 40 }
    );
  });

  it('does not depend on the order or the grouping of its trials', () => {
    fc.assert(
      fc.property(fc.array(innerProbability, { minLength: 2, maxLength: 30 }), (p) => {
        const forward = pmf(lawOf(p), p.length);
        const doubled = { levels: p.map((one) => ({ p: one, trials: 2 })), poissonPart: 0 };
        const twice = pmf(lawOf([...p.toReversed(), ...p]), 2 * p.length);
        const backward = pmf(lawOf(p.toReversed()), p.length);
        const grouped = pmf(doubled, 2 * p.length);
        forward.forEach((value, n) => expect(relative(value, backward[n])).toBeLessThan(1e-12));
        twice.forEach((value, n) => expect(relative(value, grouped[n])).toBeLessThan(1e-12));
      }),
      { numRuns: 40 }
    );
  });

  it('obeys Newton’s inequalities, with the number of trials known and unknown', () => {
    fc.assert(
      fc.property(fc.array(innerProbability, { minLength: 2, maxLength: 40 }), (p) => {
        const f = pmf(lawOf(p), p.length).map((value) => (value > 1e-290 ? value : 0));
        // Binomial laws have equality throughout, hence a room of rounding alone.
        expect(newtonViolation(f, p.length)?.excess ?? 0).toBeLessThan(1e-12);
        const mixed = pmf({ ...lawOf(p), poissonPart: 1.5 }, 60).map((value) => (value > 1e-290 ? value : 0));
        expect(newtonViolation(mixed, null)!.excess).toBeLessThan(1e-12);
      }),
      { numRuns: 100 }
    );
  });

  it('has its mode within one of the mean (Darroch 1964, from memory)', () => {
    fc.assert(
      fc.property(anyLaw, (law) => {
        const { first, values } = lawWindow(law);
        const { mean } = lawMoments(law);
        const largest = Math.max(...values);
        values.forEach((value, k) => {
          // Ties to rounding: two neighbouring modes are allowed, and both lie within one.
          if (value >= largest * (1 - 1e-14)) expect(Math.abs(first + k - mean)).toBeLessThan(1 + 1e-9);
        });
      })
    );
  });
});

describe('trim and scale', () => {
  it('leave out only ends whose parts lie under the trim', () => {
    const law = {
      levels: [
        { p: 0.3, trials: 400 },
        { p: 0.02, trials: 90 }
      ],
      poissonPart: 2
    };
    const whole = lawWindow(law);
    const cut = lawWindow(law, 1e-18, 1);
    expect(cut.scale).toBe(1);
    expect(cut.values.length).toBeLessThan(whole.values.length / 2);
    let missing = 1;
    cut.values.forEach((value, k) => {
      missing -= value;
      if (value > 1e-12) expect(relative(value, at(whole, cut.first + k))).toBeLessThan(1e-9);
    });
    expect(Math.abs(missing)).toBeLessThan(1e-14);
  });

  it('starts at the sure trials and gives the empty law one count', () => {
    expect(lawWindow({ levels: [], poissonPart: 0 })).toMatchObject({ first: 0 });
    const sure = lawWindow(
      {
        levels: [
          { p: 1, trials: 5 },
          { p: 0, trials: 9 }
        ],
        poissonPart: 0
      },
      0,
      1
    );
    expect(sure.first).toBe(5);
    expect([...sure.values]).toEqual([1]);
  });
});
