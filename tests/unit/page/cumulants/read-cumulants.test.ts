import { describe, expect, it } from 'vitest';
import { publishedPlace } from '$lib/charts/published-place';
import { FRESH_CUMULANTS, type CumulantFields } from '$lib/page/cumulants/fields';
import { roundingOf } from '$lib/page/cumulants/rounding-of';
import { generator } from '$lib/stats/random/generator';
import { judge } from '$lib/page/cumulants/judged';
import { readCumulants } from '$lib/page/cumulants/read-cumulants';

const table = (more: Partial<CumulantFields> = {}): CumulantFields => ({
  ...FRESH_CUMULANTS,
  mean: '4',
  'mean-error': '0,05',
  variance: '3.5',
  'variance-error': '0.1',
  ...more
});

const problems = (more: Partial<CumulantFields>) => {
  const read = readCumulants(table(more));
  return read.ok ? {} : read.problems;
};

describe('readCumulants', () => {
  it('reads two to four cumulants, with a comma or a point', () => {
    const read = readCumulants(table({ third: '−1e-1', 'third-error': '0.2', trials: '64' }));
    expect(read).toEqual({
      ok: true,
      printed: {
        trials: 64,
        mean: { value: 4, error: 0.05 },
        variance: { value: 3.5, error: 0.1 },
        third: { value: -0.1, error: 0.2 },
        fourth: null
      }
    });
  });

  it.each([
    [{ mean: '' }, 'mean', /Write a number/],
    [{ mean: 'four' }, 'mean', /plain number/],
    [{ mean: '-1' }, 'mean', /not negative/],
    [{ trials: '3' }, 'mean', /above N = 3/],
    [{ trials: '2.5' }, 'trials', /whole number/],
    [{ variance: '-0.2' }, 'variance', /negative variance/],
    [{ variance: '−1' }, 'variance', /negative variance/],
    [{ variance: '–1' }, 'variance', /negative variance/],
    [{ variance: '3.5 ± 0.1' }, 'variance', /the number alone/],
    [{ variance: '3.5(1)' }, 'variance', /the number alone/],
    [{ mean: '12345', trials: '12344' }, 'mean', /above N = 12\u202f344:/],
    [{ 'mean-error': '0' }, 'mean-error', /error of 0 would make the number exact/],
    [{ 'variance-error': '0' }, 'variance-error', /error of 0 would make the number exact/],
    [{ 'variance-error': '-0.1' }, 'variance-error', /above 0/],
    [{ 'variance-error': '1e-400' }, 'variance-error', /error of 0/],
    [{ third: 'NaN', 'third-error': '0.2' }, 'third', /plain number.*leave it empty, and its error too/],
    [{ third: 'Infinity', 'third-error': '0.2' }, 'third', /plain number/],
    [{ third: '1e400', 'third-error': '0.2' }, 'third', /up to 10¹² in size/],
    [{ third: '', 'third-error': '0.2' }, 'third', /Write a number.*leave it empty/],
    [{ third: '2', 'third-error': 'NaN' }, 'third-error', /standard error/],
    [{ variance: '3.4000000000001', 'variance-error': '' }, 'variance-error', /standard error/],
    [{ fourth: '1', 'fourth-error': '1' }, 'third', /only with the third/]
  ] as const)('refuses %o beside %s', (more, field, words) => {
    expect(problems(more)[field]).toMatch(words);
  });
});

describe('cumulants without an error', () => {
  it.each([
    ['4', 0.5],
    ['4.05', 0.005],
    ['−0,30', 0.005],
    ['1.50e-3', 0.000005],
    ['12 000', 0.5],
    ['.5', 0.05],
    ['3.', 0.5],
    ['four', null],
    ['', null]
  ])('%s is known to half a unit of its last digit', (typed, half) => {
    expect(roundingOf(typed)).toBe(half);
  });

  /** Moments of independent trials, rounded to so many decimals. */
  const rounded = (ps: number[], decimals: number): CumulantFields => {
    const sum = (of: (p: number) => number) => ps.reduce((all, p) => all + of(p), 0).toFixed(decimals);
    return {
      ...FRESH_CUMULANTS,
      trials: String(ps.length),
      mean: sum((p) => p),
      variance: sum((p) => p * (1 - p)),
      third: sum((p) => p * (1 - p) * (1 - 2 * p)),
      fourth: sum((p) => p * (1 - p) * (1 - 6 * p * (1 - p)))
    };
  };

  it('are never said to lie outside where trials were rounded', async () => {
    const random = generator(3, 0);
    let printedOutside = 0;
    for (let table = 0; table < 300; table++) {
      const equal = random.next();
      const ps = Array.from({ length: 2 + (table % 20) }, () => (table % 2 ? equal : random.next()));
      const read = readCumulants(rounded(ps, 1 + (table % 3)));
      // The mean may be rounded to N or 0, the variance to 0.
      if (!read.ok) throw new Error(JSON.stringify(read.problems));
      const { verdict, statement } = await judge(read.printed, '');
      expect(['undecided'], statement).toContain(verdict.verdict);
      expect(statement).toMatch(/^Some independent trials (can have|may have had) these cumulants/);
      expect(statement).toMatch(/half a unit of the last digit typed is taken/);
      if (verdict.nearest.distance > 0) printedOutside++;
    }
    // What made the rule: equal trials lie on the edge, and rounding puts half of them outside.
    expect(printedOutside).toBeGreaterThan(50);
  });

  it('far outside are said to be, but not to be ruled out, since shots scatter', async () => {
    const read = readCumulants(
      table({ 'mean-error': '', 'variance-error': '', mean: '4.00', variance: '6.00' })
    );
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    const { verdict, statement } = await judge(read.printed, '');
    expect(verdict.verdict).toBe('undecided');
    expect(statement).toMatch(
      /^As printed, rounding allowed for, .*variance is above its ceiling.*If they are exact/
    );
    expect(statement).toMatch(/No error was given for the mean and variance/);
  });
});

describe('a third cumulant without an error beside mean and variance that have theirs', () => {
  const judged = async (more: Partial<CumulantFields>) => {
    const read = readCumulants(table(more));
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    return judge(read.printed, '');
  };

  it('withdraws nothing that the other two rule out', async () => {
    const two = {
      mean: '4.00',
      'mean-error': '0.01',
      variance: '5.00',
      'variance-error': '0.02',
      trials: ''
    };
    const { verdict, statement, printed } = await judged({ ...two, third: '6.5', 'third-error': '' });
    expect(verdict.verdict).toBe('ruled-out');
    expect(verdict).toEqual((await judged({ ...two, third: '' })).verdict);
    expect(printed.third).toBeNull();
    expect(statement).toMatch(/No error was given for the third cumulant: it is left out, since/);
  });

  it('is not told as rounding where chance put the others outside', async () => {
    const { statement } = await judged({
      ...{ mean: '4.00', 'mean-error': '0.05', variance: '4.05', 'variance-error': '0.1', trials: '' },
      ...{ third: '4.0', 'third-error': '', fourth: '4.0', 'fourth-error': '0.4' }
    });
    expect(statement).toMatch(/^Within their errors some independent trials can have these cumulants/);
    expect(statement).not.toMatch(/rounded/);
    expect(statement).toMatch(/left out, and with it the fourth, since/);
  });
});

describe('the place of printed cumulants', () => {
  const placed = async (more: Partial<CumulantFields>) => {
    const read = readCumulants(table({ third: '3', 'third-error': '0.3', ...more }));
    if (!read.ok) throw new Error(JSON.stringify(read.problems));
    const { printed, verdict } = await judge(read.printed, '');
    return publishedPlace(printed, verdict);
  };

  it('is inside, near, outside or over the ceiling', async () => {
    // Between 4·F(2F − 1) = 2.625 and 4·F = 3.5, F = 0.875.
    expect((await placed({}))?.standing).toBe('inside');
    expect((await placed({ variance: '4.1', third: '4' }))?.standing).toBe('near');
    expect((await placed({ variance: '6', third: '9' }))?.standing).toBe('more');
    // κ3/κ1 of 3 with κ2/κ1 of 0.875: the upper edge is κ2/κ1 itself.
    expect((await placed({ third: '12' }))?.standing).toBe('outside');
  });

  it('has intervals of 1.96 errors of the ratio', async () => {
    const place = (await placed({}))!;
    // κ2/κ1 = 0.875; error √(0.1² + (0.875·0.05)²)/4 = 0.02729.
    expect(place.fano.value).toBeCloseTo(0.875, 12);
    expect(place.fano.high! - place.fano.value).toBeCloseTo(1.96 * 0.02729, 4);
  });

  it('needs a third cumulant and a mean inside 0 … N', async () => {
    const read = readCumulants(table());
    if (!read.ok) throw new Error('refused');
    const { printed, verdict } = await judge(read.printed, '');
    expect(publishedPlace(printed, verdict)).toBeNull();
  });
});
