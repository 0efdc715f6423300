import { describe, expect, it } from 'vitest';
import { publishedPlace } from '$lib/charts/published-place';
import { FRESH_CUMULANTS, type CumulantFields } from '$lib/page/cumulants/fields';
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
    [{ 'variance-error': '' }, 'variance-error', /standard error/],
    [{ third: '1' }, 'third-error', /standard error/],
    [{ fourth: '1', 'fourth-error': '1' }, 'third', /only with the third/]
  ] as const)('refuses %o beside %s', (more, field, words) => {
    expect(problems(more)[field]).toMatch(words);
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
