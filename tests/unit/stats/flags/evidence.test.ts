import { allEven, gradeOf, stronger } from '$lib/stats/flags/evidence';
import { describe, expect, it } from 'vitest';
import { evidence, interval } from './make-evidence';

describe('gradeOf', () => {
  it('is shown at α, hinted at 5 %, after adjustment', () => {
    const of = (p: number) => gradeOf(evidence({ p: { ceiling: p } }), 'ceiling');
    expect([0.01, 0.0101, 0.05, 0.0501].map(of)).toEqual(['shown', 'hinted', 'hinted', null]);
    const strict = evidence({ p: { ceiling: 0.005 } });
    expect(gradeOf({ ...strict, options: { ...strict.options, alpha: 0.001 } }, 'ceiling')).toBe('hinted');
  });

  it('is nothing for a test that did not run', () => {
    expect(gradeOf(evidence({ p: { 'low-tail': undefined } }), 'low-tail')).toBeNull();
  });

  it('is shown for the tail that a certificate rules out', () => {
    const certificate = {
      p: 1e-5,
      side: 'high' as const,
      count: 15,
      thresholds: 9,
      bound: 1e-4,
      shots: 9,
      mean: 6
    };
    const of = evidence({ over: { certificate } });
    expect(gradeOf(of, 'high-tail')).toBe('shown');
    expect(gradeOf(of, 'low-tail')).toBeNull();
    expect(gradeOf(evidence({ over: { certificate: { ...certificate, p: 0.02 } } }), 'high-tail')).toBeNull();
  });
});

describe('stronger', () => {
  it('takes shown before hinted before nothing', () => {
    expect(stronger('hinted', 'shown')).toBe('shown');
    expect(stronger(null, 'hinted')).toBe('hinted');
    expect(stronger('hinted', null)).toBe('hinted');
    expect(stronger(null, null)).toBeNull();
  });
});

describe('allEven', () => {
  it('needs every shot even, and more than one count', () => {
    const even = { seen: 3000, expected: 0.5, oneCountAlone: false };
    expect(allEven(evidence({ over: { even } }))).toBe(true);
    expect(allEven(evidence({ over: { even: { ...even, seen: 2999 } } }))).toBe(false);
    expect(allEven(evidence({ over: { even: null } }))).toBe(false);
    expect(allEven(evidence({ dispersion: interval(0), over: { even } }))).toBe(false);
  });
});
