import { documentCsv } from '$lib/model/document-csv';
import { formatNumber } from '$lib/model/format-number';
import { withoutCounts } from '$lib/model/link/summary';
import { summaryNuisances } from '$lib/model/link/summary-nuisances';
import { plainText } from '$lib/model/plain-text/plain-text';
import { toPlain } from '$lib/model/quote/notation/to-plain';
import { quoteOf } from '$lib/model/quote/quote-of';
import { NO_PROVENANCE } from '$lib/model/quote/provenance';
import { asTyped } from '$lib/model/report/as-typed';
import { sayCriticalTrials } from '$lib/model/report/say-critical-trials';
import { sayNeededRate } from '$lib/model/report/say-misreads';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { Diagnosis, Interval } from '$lib/stats/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { readKinks } from '../../stats/misread/read-kinks';

const flat = (text: string) => text.replace(/\s*\n\s*/g, ' ');
let applied: Diagnosis;
let raw: Diagnosis;
beforeAll(async () => {
  // Invented: independent kinks, p = 0.05 on 60 bonds, 2 % of the sites misread.
  const data = readKinks(6, 60, 0.05, 0.02, 3000);
  const options = { ...defaultOptions, trials: 60, geometry: 'open-bonds' as const, resamples: 19 };
  applied = await diagnose(data, { ...options, misread: 0.02 });
  raw = await diagnose(data, options);
});
const rows = (document: Diagnosis) => new Map(sayNuisances(document, null));

describe('a misread rate that is allowed for', () => {
  it('has both ceilings side by side, and the plain one is μ(1 − μ/N)', () => {
    const mean = applied.moments.mean.value!;
    const said = rows(applied).get('Ceiling as read')!;
    expect(said).toContain(`With misreads ${formatNumber(applied.moments.ceiling)}`);
    expect(said).toContain(`without ${formatNumber(mean * (1 - mean / 60))}`);
    expect(said).toContain(
      `${formatNumber(applied.moments.variance.value! / (mean * (1 - mean / 60)))} times the second`
    );
    expect(rows(raw).has('Ceiling as read')).toBe(false);
  });

  it('tells the needed rate to hold against the calibration, near the rate of the simulation', () => {
    const { value, low, high } = applied.nuisances!.misread!.neededRate;
    expect(low!).toBeLessThan(0.02);
    expect(high!).toBeGreaterThan(0.015);
    expect(rows(applied).get('Misread rate needed')).toContain(
      `To compare with your calibration: ${formatNumber(100 * value!, 2)}`
    );
    expect(rows(raw).get('Misread rate needed')).toBe(rows(applied).get('Misread rate needed'));
  });

  it('is told in words of its own where none is allowed for, and never as tests without misreads', () => {
    const methods = (document: Diagnosis) => toPlain(quoteOf(document, NO_PROVENANCE).methods);
    expect(rows(applied).get('Misread sites')).toContain('every test, bound and flag allows for it');
    expect(methods(applied)).toContain('independent kinks read with it');
    expect(methods(applied)).not.toContain('without misreads');
    const stated: Diagnosis = {
      ...raw,
      data: { ...raw.data, misread: 0.02, geometry: 'ring-bonds' },
      nuisances: undefined
    };
    expect(methods(stated)).toContain('against laws without misreads');
    expect(rows(stated).get('Misread sites')).toContain('against laws without misreads');
    expect(methods({ ...stated, data: { ...stated.data, geometry: 'sites' } })).not.toContain('against laws');
  });

  it('lists every bond once', () => {
    const said = rows(applied).get('Kinks along the chain')!;
    const bonds = applied.nuisances!.misread!.kinks!.reduce((sum, { trials }) => sum + trials, 0);
    expect(bonds).toBe(60);
    expect(said).toMatch(/[Bb]onds? 1\b/);
    if (applied.nuisances!.misread!.kinks!.length <= 6) expect(said).toMatch(/to 60: |bond 60: /);
  });

  it('is in the text of the command line and in the table of numbers', () => {
    const text = flat(plainText(applied));
    for (const [what, known] of rows(applied)) expect(text).toContain(`${what}. ${known}`);
    const csv = documentCsv(applied);
    const { rawCeiling, neededRate } = applied.nuisances!.misread!;
    expect(csv).toContain(`misreads,rawCeiling,,${rawCeiling},,\r\n`);
    expect(csv).toContain(
      `misreads,neededRate,,${neededRate.value},${neededRate.low},${neededRate.high}\r\n`
    );
    expect(documentCsv({ ...raw, nuisances: undefined })).not.toContain('misreads,');
  });

  it('is told where the counts are kept back, without the ceilings', () => {
    const summary = withoutCounts(applied);
    const told = summaryNuisances(summary, null);
    const text = JSON.stringify(told);
    expect(text).toContain('every test, bound and flag allows for it');
    expect(text).not.toContain(formatNumber(applied.moments.ceiling));
    expect(JSON.stringify(summary)).not.toContain(String(applied.nuisances!.misread!.rawCeiling));
    expect(toPlain(quoteOf(summary, NO_PROVENANCE).methods)).toContain('independent kinks read with it');
  });

  it('has no least N, and does not say that the variance is over the mean', () => {
    expect(applied.moments.criticalTrials).toBeNull();
    expect(sayCriticalTrials(applied)).toContain('no least N');
    const lumped = { ...raw, data: { ...raw.data, lump: { from: 9, shots: 3 } } };
    expect(sayCriticalTrials({ ...lumped, moments: { ...raw.moments, criticalTrials: null } })).toContain(
      'lumps counts'
    );
  });
});

it.each<[Interval, RegExp]>([
  [{ value: 0, low: 0, high: 0.01 }, /none\. The variance is under the ceiling.* would need 1\.0.%/],
  [{ value: 0.01, low: 0, high: null }, /1\.0.% of the sites .*: none to more than misreads can give/],
  [{ value: null, low: 0.2, high: null }, /more than misreads can give.*asks for 20.%/],
  [{ value: null, low: null, high: null }, /or it has no value here\.$/]
])('the needed rate %j is said', (neededRate, words) => {
  const said = sayNeededRate({
    data: raw.data,
    flags: [],
    nuisances: { misread: { applied: false, neededRate } }
  });
  expect(said).toMatch(words);
});

describe('what people stated', () => {
  it('is told as typed, as missing, or not at all', () => {
    const said = (stated: Parameters<typeof sayNuisances>[1]) =>
      new Map(sayNuisances(raw, stated)).get('Post-selection')!;
    expect(said({ postSelection: 'empty shots dropped' })).toContain('“\u2068empty shots dropped\u2069”');
    expect(said({ postSelection: null })).toContain('None is stated');
    for (const blind of [null, {}]) expect(said(blind)).toContain('not told here');
  });

  it('turns nothing outside of its quotation marks', () =>
    expect(asTyped(' a\u202Eb\u2069c ')).toBe('“\u2068abc\u2069”'));
});
