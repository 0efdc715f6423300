import { compareResults } from '$lib/model/compare/compare-results';
import type { Comparable } from '$lib/model/compare/compared';
import type { Interval } from '$lib/stats/types';
import { describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../../support/saved-reports';

const part = (a: Comparable, b: Comparable, id: string) =>
  compareResults(a, b).parts.find((one) => one.id === id)!;
const changedLines = (a: Comparable, b: Comparable, id: string) =>
  part(a, b, id)
    .lines.filter((line) => line.changed)
    .map((line) => line.name);

describe('compareResults', () => {
  it('finds nothing between a result and itself', async () => {
    const one = await diagnoseInvented();
    const comparison = compareResults(one, one);
    expect(comparison.changes).toBe(0);
    expect(comparison.parts.every((p) => p.lines.every((line) => !line.changed))).toBe(true);
    expect(comparison.summary).toContain('No number of the result changed by more than rounding.');
  });

  it('names the option that differs, and the numbers that follow from it', async () => {
    const [few, many] = [await diagnoseInvented({ trials: 3 }), await diagnoseInvented({ trials: 12 })];
    expect(changedLines(few, many, 'options')).toEqual(['Trials in a shot, N']);
    expect(part(few, many, 'options').lines[0]).toMatchObject({ first: 3, second: 12, changed: true });
    // The ceiling is μ(1 − μ/N): it moves with N, and so does the interval of the mean, but not its value.
    expect(changedLines(few, many, 'moments')).toContain('Ceiling of the variance');
    const [mean] = part(few, many, 'moments').lines;
    expect(mean.first).toMatchObject({ value: (mean.second as Interval).value });
    expect(compareResults(few, many).summary.join(' ')).toContain(
      'Asked for differently: Trials in a shot, N.'
    );
  });

  it('says of two seeds that chance alone moved the p-values', async () => {
    const [one, other] = [await diagnoseInvented({ seed: 1 }), await diagnoseInvented({ seed: 2 })];
    const { summary } = compareResults(one, other);
    expect(changedLines(one, other, 'options')).toEqual(['Seed']);
    expect(changedLines(one, other, 'fit')).not.toContain('Log-likelihood');
    expect(summary.join(' ')).toContain('Only the random draws differ');
  });

  it('tells a change of engine and of verdict', async () => {
    const one = await diagnoseInvented();
    const other = structuredClone(one);
    other.document.engine.version = '9.9.9';
    other.document.answer.verdict = one.document.answer.verdict === 'ruled-out' ? 'undecided' : 'ruled-out';
    const { summary } = compareResults(one, other);
    expect(changedLines(one, other, 'engine')).toEqual(['Version']);
    expect(changedLines(one, other, 'answer')).toEqual(['Answer']);
    expect(summary[0]).toMatch(/^The answer changed: from “.+” to “.+”\.$/);
    expect(summary.join(' ')).toContain('9.9.9');
  });

  it('lines up tests that ran in one result alone, and flags raised in one alone', async () => {
    const one = await diagnoseInvented();
    const other = structuredClone(one);
    const [gone] = other.document.tests.splice(0, 1);
    other.document.flags.push({
      id: 'drift',
      grade: 'hinted',
      tests: [],
      statement: '',
      size: '',
      otherCauses: [],
      next: []
    });
    const lines = part(one, other, 'tests').lines;
    expect(lines).toHaveLength(2 * one.document.tests.length);
    expect(lines.find((line) => line.second === 'not run')).toMatchObject({ first: gone.pAdjusted });
    expect(part(one, other, 'flags').lines.find((line) => line.name === 'Drift')).toEqual({
      name: 'Drift',
      first: 'not raised',
      second: 'hinted at',
      changed: true,
      slight: false
    });
  });

  it('warns when the counts are not the same', async () => {
    const one = await diagnoseInvented();
    const other = structuredClone(one);
    other.document.data.digest = `sha256:${'0'.repeat(64)}`;
    expect(compareResults(one, other).summary.join(' ')).toContain('different counts');
  });

  it('tells rounding from change', async () => {
    const one = await diagnoseInvented();
    const other = structuredClone(one);
    other.document.fit.logLikelihood *= 1 + 1e-12;
    other.document.moments.ceiling *= 1 + 1e-4;
    [one.document.fit.floor, other.document.fit.floor] = [3e-17, 5e-17];
    [one.document.tests[0].p, other.document.tests[0].p] = [3e-17, 5e-17];
    const line = (id: string, name: string) => part(one, other, id).lines.find((l) => l.name === name);
    expect(line('fit', 'Log-likelihood')).toMatchObject({ changed: true, slight: true });
    expect(line('moments', 'Ceiling of the variance')).toMatchObject({ changed: true, slight: false });
    expect(line('fit', 'Floor of any law')).toMatchObject({ slight: true });
    // A tiny p is not nothing.
    expect(part(one, other, 'tests').changes).toBe(1);
    expect(compareResults(one, other).changes).toBe(2);
  });
});
