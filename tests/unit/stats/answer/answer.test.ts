import { answer } from '$lib/stats/answer/answer';
import { changesOf } from '$lib/stats/rate-interval/changes-of';
import { raiseFlags } from '$lib/stats/flags/raise-flags';
import type { Evidence } from '$lib/stats/flags/evidence';
import { describe, expect, it } from 'vitest';
import { evidence, interval, ran, type Made } from '../flags/make-evidence';

const judge = (made: Made) => {
  const of = evidence(made);
  return answer(of, raiseFlags(of));
};
const certificate = {
  p: 1e-5,
  side: 'high' as const,
  count: 15,
  thresholds: 9,
  bound: 1e-4,
  shots: 9,
  mean: 6
};
const options = evidence().options;

describe('the verdict', () => {
  it.each<[string, Made, string]>([
    ['nothing found, the excess excluded', {}, 'compatible'],
    ['any adjusted p at α', { p: { parity: 0.01 } }, 'ruled-out'],
    ['any adjusted p just above α', { p: { parity: 0.0101 } }, 'compatible'],
    ['a certificate at α', { over: { certificate: { ...certificate, p: 0.01 } } }, 'ruled-out'],
    ['a certificate above α', { over: { certificate: { ...certificate, p: 0.02 } } }, 'compatible'],
    ['drift between batches', { p: { batches: 0.001 } }, 'ruled-out'],
    ['an upper limit just under 1 + tolerance', { dispersion: interval(1, 0.9, 1.0999) }, 'compatible'],
    ['an upper limit at 1 + tolerance', { dispersion: interval(1, 0.9, 1.1) }, 'undecided'],
    ['no upper limit', { dispersion: { value: 1, low: 0.9, high: null } }, 'undecided'],
    [
      'a wider tolerance',
      { dispersion: interval(1, 0.8, 1.3), over: { options: { ...options, tolerance: 0.5 } } },
      'compatible'
    ],
    ['49 shots, however regular', { dispersion: interval(0.5), over: { shots: 49 } }, 'undecided'],
    ['one trial', { over: { trials: 1 } }, 'undecided'],
    ['far below the ceiling', { dispersion: interval(0.4) }, 'compatible']
  ])('%s', (_name, made, want) => {
    expect(judge(made).verdict).toBe(want);
  });

  it('is not compatible when a test is as extreme as its resamples can show', () => {
    const blind: Evidence = evidence();
    blind.tests = blind.tests.map((test) => ({ ...test, smallestP: 1 / 100, resamples: 99 }));
    blind.tests[0] = { ...ran('ceiling', 0.06), p: 1 / 100, smallestP: 1 / 100, resamples: 99 };
    const found = answer(blind, []);
    expect(found).toMatchObject({ verdict: 'undecided', shotsToDecide: null });
    expect(found.statement).toMatch(/one test is as extreme as so few can show\. Use at least 600\./);
  });
});

describe('the numbers beside it', () => {
  it('smallest excess whatever the verdict, shots to decide only when undecided', () => {
    const compatible = judge({});
    expect(compatible.smallestExcess).toBeCloseTo(2.49 * Math.sqrt((2 * (1 - 1 / 20)) / 3000), 9);
    expect(compatible.shotsToDecide).toBeNull();
    const undecided = judge({ dispersion: interval(1, 0.7, 1.4), over: { shots: 200 } });
    expect(undecided.shotsToDecide).toBeGreaterThan(200);
    expect(undecided.statement).toContain('would decide');
    expect(judge({ p: { fit: 0.001 } }).shotsToDecide).toBeNull();
  });

  it('no smallest excess where no number of shots would see one', () => {
    expect(judge({ over: { trials: 1 } }).smallestExcess).toBeNull();
    expect(judge({ dispersion: interval(0) }).smallestExcess).toBeNull();
    // Two shots: an eye for 3.4 times the ceiling is none.
    expect(judge({ over: { shots: 2 } }).smallestExcess).toBeNull();
  });
});

describe('the words', () => {
  const cases: Made[] = [
    {},
    { dispersion: interval(0.5) },
    { p: { ceiling: 0.001, 'high-tail': 0.01, 'low-tail': 0.01 } },
    { over: { certificate } },
    { p: { batches: 0.002 }, over: { neighbours: 'alike' }, dispersion: interval(1.3) },
    { dispersion: interval(1, 0.7, 1.4), over: { shots: 200 } },
    { dispersion: interval(0) }
  ];

  it('never prove, and never say that counts or defects are independent', () => {
    for (const made of cases) {
      const { statement, because } = judge(made);
      for (const sentence of [statement, ...because]) {
        expect(sentence).not.toMatch(
          /prove[sdn]?\b|\b(is|are) independent|independence is|NaN|undefined|null|Infinity/i
        );
        expect(sentence).toMatch(/[.!?]$/);
      }
    }
  });

  it('say of every compatible result that compatible is not independent', () => {
    expect(judge({}).because.join(' ')).toContain('not the same as independent');
    expect(judge({ dispersion: interval(0.5) }).statement).toContain(
      'repulsion between defects would also give'
    );
  });

  it('begin with the number of shots, and name the strongest finding with its adjusted p', () => {
    const { statement, because } = judge({ p: { ceiling: 0.002, 'high-tail': 0.008 } });
    expect(statement).toMatch(
      /^Independent trials cannot explain these 3\u202f000 shots: counts this uneven/
    );
    expect(statement).toContain('once in 500 repeats');
    expect(statement).toContain('all 6 tests allowed for');
    expect(because).toHaveLength(3);
    expect(because[0]).toMatch(/^Variance ceiling/);
    expect(because[1]).toMatch(/^High tail/);
  });

  it('put the certificate first, since it needs neither fit nor simulation', () => {
    const { statement, because } = judge({ p: { fit: 0.001 }, over: { certificate } });
    expect(because[0]).toMatch(
      /^Exact certificate, without fit or simulation: 0\.\d\d\u202f% of the shots \(9\) have a count of 15 or more, and no independent/
    );
    expect(statement).toContain('whatever their probabilities');
  });

  it('name the ordinary cause that must be settled first', () => {
    const even = { seen: 3000, expected: 0.5, oneCountAlone: false };
    expect(judge({ p: { parity: 0.001 }, over: { even } }).statement).toContain('pairs should be counted');
    const drift = judge({ p: { order: 0.001 }, dispersion: interval(1.3), over: { neighbours: 'alike' } });
    expect(drift.statement).toContain('the rate changed while the shots were taken');
    const alternating = judge({
      p: { order: 0.001 },
      dispersion: interval(1.3),
      over: { neighbours: 'alternating' }
    });
    expect(alternating.statement).not.toContain('the rate changed');
  });

  it('say what one shot, no defect and one count are worth', () => {
    const base = evidence();
    const none = { value: null, low: null, high: null };
    const one: Evidence = {
      ...base,
      shots: 1,
      tests: [],
      moments: { ...base.moments, variance: none, dispersion: none, pairCovariance: null }
    };
    expect(answer(one, []).statement).toMatch(/^One shot cannot tell/);
    const empty = {
      ...base,
      tests: [],
      moments: { ...base.moments, mean: interval(0), variance: interval(0), dispersion: none }
    };
    expect(answer(empty, []).statement).toMatch(/^No defect was seen in 3\u202f000 shots/);
    const same = { ...empty, moments: { ...empty.moments, mean: interval(4) } };
    expect(answer(same, []).statement).toMatch(/had the same count/);
    for (const of of [one, empty, same]) expect(answer(of, []).verdict).toBe('undecided');
  });
});

describe('odd counts on a ring', () => {
  const on = (seen: number, geometry: 'ring-bonds' | 'sites') =>
    judge({
      over: { options: { ...options, geometry }, even: { seen, expected: 0.5, oneCountAlone: false } }
    }).statement;

  it('leave a reservation in the answer, with their number; even ones and other geometries none', () => {
    expect(on(1500, 'ring-bonds')).toMatch(/no ring gives an odd count, and 1\u202f?500 of these are odd/);
    expect(on(3000, 'ring-bonds')).not.toContain('odd');
    expect(on(1500, 'sites')).not.toContain('odd');
  });
});

describe('a misread rate with an uncertainty', () => {
  const at = (rate: number, verdict: 'ruled-out' | 'compatible' | 'undecided') => ({
    rate,
    verdict,
    ceiling: 4.2,
    dispersion: interval(1)
  });
  const over = (rates: ReturnType<typeof at>[]) => ({
    over: {
      misread: { applies: true as const, rate: 0.01 },
      rates: {
        uncertainty: 0.001,
        miss: 1e-4,
        low: rates[0].rate,
        high: rates[rates.length - 1].rate,
        cutByCounts: false,
        rates,
        changes: changesOf(rates),
        statement: 'Rates.'
      }
    }
  });

  it('is compatible only where it is so at every rate', () => {
    expect(judge(over([at(0.006, 'compatible'), at(0.014, 'compatible')]))).toMatchObject({
      verdict: 'compatible'
    });
    const changes = judge(over([at(0.006, 'ruled-out'), at(0.014, 'compatible')]));
    expect(changes).toMatchObject({ verdict: 'undecided', shotsToDecide: null });
    expect(changes.statement).toMatch(/not known well enough.*0\.600.% independent trials are ruled out/);
    expect(changes.because).toContain('Rates.');
  });

  it('cannot tell where each rate is ruled out by another test', () => {
    const found = judge(over([at(0.006, 'ruled-out'), at(0.014, 'ruled-out')]));
    expect(found.verdict).toBe('undecided');
    expect(found.statement).toContain('no test does so at all of them');
  });
});
