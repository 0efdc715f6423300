import { checkClaim, type TypedClaim } from '$lib/model/claim/check-claim';
import { quantitiesOf } from '$lib/model/claim/quantities';
import { withoutCounts } from '$lib/model/link/summary';
import { documentText } from '$lib/model/document-text';
import type { Diagnosis } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { diagnoseNine } from '../../../support/links';

const settings = { level: 0.99, share: 0.1 };
let document: Diagnosis;

beforeAll(async () => {
  ({ document } = await diagnoseNine());
});

function check(id: string, value: string, uncertainty = '', kind: TypedClaim['kind'] = 'one-sigma') {
  const quantity = quantitiesOf(document).find((one) => one.id === id);
  if (!quantity) throw new Error(`no ${id}`);
  return checkClaim(quantity, { value, uncertainty, kind }, settings);
}

const verdict = (...claim: Parameters<typeof check>) => {
  const checked = check(...claim);
  return checked.ok ? checked.verdict : `${checked.field} ${checked.problem}`;
};

describe('checkClaim', () => {
  it('agrees with what the counts give, to the digits given', () => {
    const sum = [409, 2 * 611, 3 * 523, 4 * 347, 5 * 163, 6 * 59, 7 * 19, 8 * 5].reduce((a, b) => a + b);
    const shots = 137 + 409 + 611 + 523 + 347 + 163 + 59 + 19 + 5;
    expect(document.moments.mean.value).toBeCloseTo(sum / shots, 12);
    const checked = check('mean', (sum / shots).toFixed(2));
    expect(checked).toMatchObject({ ok: true, verdict: 'agrees' });
    expect(checked.ok && checked.sentence).toMatch(/same number/);
  });

  it('disagrees with a mean that is far off, unless its uncertainty is as large', () => {
    expect(verdict('mean', '3.0')).toBe('disagrees');
    expect(verdict('mean', '3.1(3)')).toBe('agrees');
    expect(verdict('mean', '3.1', '0.3')).toBe('agrees');
    // ±0.3 at 95 % is half of ±0.3 at one σ: 0.49 away is 3.1 σ.
    expect(verdict('mean', '3.1', '0.3', 'ninety-five')).toBe('disagrees');
  });

  it('cannot tell a third cumulant that these shots do not settle', () => {
    const { third } = document.moments;
    expect(verdict('third', third.value!.toFixed(3))).toBe('cannot-tell');
    expect(verdict('third', String(third.value! + 20 * (third.high! - third.value!)))).toBe('disagrees');
  });

  it('checks ratios and divergence', () => {
    const { fano, third, mean } = document.moments;
    expect(verdict('fano', fano.value!.toFixed(3))).toBe('agrees');
    expect(verdict('fano', '1.4')).toBe('disagrees');
    expect(verdict('third-over-mean', (third.value! / mean.value! + 3).toFixed(2))).toBe('disagrees');
    expect(verdict('divergence', '0.5')).toBe('disagrees');
  });

  it('checks p-values by their test, stated or as less than', () => {
    const fit = document.tests.find((test) => test.id === 'fit')!;
    expect(fit.p).toBeGreaterThan(0.05);
    expect(verdict('p-fit', '< 0.001')).toBe('disagrees');
    expect(verdict('p-fit', '< 0.999')).toBe('agrees');
    expect(verdict('p-fit', fit.p.toFixed(2))).not.toBe('disagrees');
    expect(verdict('p-fit', '0.0001')).toBe('disagrees');
  });

  it.each([
    ['mean', 'four', '', /^value is not a number/],
    ['mean', '-1', '', /^value cannot be negative/],
    ['p-fit', '1.2', '', /^value cannot be above 1/],
    ['mean', '< 3', '', /^value “less than”/],
    ['mean', '3', 'some', /^uncertainty is not a number/],
    ['mean', '3', '-1', /^uncertainty is not a number/],
    ['mean', '3.0(2)', '0.2', /^uncertainty stands in brackets/]
  ])('%s %s ± %s is refused in words', (id, value, uncertainty, problem) =>
    expect(verdict(id, value, uncertainty)).toMatch(problem)
  );

  it('works on a report without its counts, as far as that goes', () => {
    const summary = withoutCounts(JSON.parse(documentText(document)) as Diagnosis);
    const ids = quantitiesOf(summary).map(({ id }) => id);
    expect(ids).toEqual(quantitiesOf(document).map(({ id }) => id));
    const third = quantitiesOf({ ...summary, moments: { ...summary.moments, third: null } })[2];
    expect(checkClaim(third, { value: '1', uncertainty: '', kind: 'one-sigma' }, settings)).toMatchObject({
      verdict: 'cannot-tell'
    });
    expect(third.note).toMatch(/kept back/);
  });

  it('says that a comma was read as a decimal one', () => {
    const checked = check('mean', '1,234', '1,000');
    expect(checked.ok && checked.sentence).toMatch(
      /The claim was read as 1\.234\. The uncertainty was read as 1\.000\.$/
    );
    const clear = check('mean', '2,61');
    expect(clear.ok && clear.sentence).not.toMatch(/read as/);
  });

  it('says every finding without undefined or NaN', () => {
    for (const quantity of quantitiesOf(document))
      for (const value of ['0', '0.001', '0.5', '1'])
        for (const uncertainty of ['', '0', '10']) {
          const checked = checkClaim(quantity, { value, uncertainty, kind: 'one-sigma' }, settings);
          expect(checked.ok && checked.sentence).toMatch(/^The report /);
          expect(checked.ok && checked.sentence).not.toMatch(/NaN|undefined|null|Infinity|–/);
        }
  });
});
