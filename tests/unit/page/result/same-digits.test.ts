import ChartTable from '$lib/charts/ChartTable.svelte';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { distributionTable } from '$lib/charts/distribution-table';
import { tailsTable } from '$lib/charts/tails-table';
import { testsTable } from '$lib/charts/tests-table';
import { readCounts } from '$lib/formats/read-counts';
import { documentCsv } from '$lib/model/document-csv';
import { documentText } from '$lib/model/document-text';
import { distributionCsv } from '$lib/model/exports/distribution-csv';
import { tailsCsv } from '$lib/model/exports/tails-csv';
import { TESTS } from '$lib/model/labels';
import { plainText } from '$lib/model/plain-text/plain-text';
import { documentSha256 } from '$lib/model/quote/document-sha256';
import { printedQuote } from '$lib/model/quote/printed-quote';
import { NO_PROVENANCE } from '$lib/model/quote/provenance';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import Parts from '$lib/page/result/Parts.svelte';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { createRawSnippet } from 'svelte';
import { render } from 'svelte/server';
import { beforeAll, describe, expect, it } from 'vitest';
import { BLIND } from '../../pdf/documents';
import { plainSpaces, readPdf } from '../../pdf/read-pdf';
import { rowsOfPage, rowsOfPdf, tablesOf, textOf, wrongs } from './printed-tables';
import { NUMBER, printed, unlike } from './same-digits';
import { explanationsOfPdf, wrongExplanations } from './told-explanations';

/** All three verdicts, pairs, a lump, trials unknown, shots in order. */
const CASES: [file: string, verdict: Diagnosis['answer']['verdict'], options: Partial<DiagnoseOptions>][] = [
  ['weldon-dice.csv', 'compatible', { trials: 12 }],
  ['weldon-dice-lumped.csv', 'compatible', { trials: 12 }],
  ['greenwood-yule.csv', 'ruled-out', {}],
  ['horse-kicks.csv', 'undecided', {}],
  ['demo/ring-kinks.csv', 'compatible', { trials: 40, unit: 'pair', geometry: 'ring-bonds' }],
  ['demo/forty-shots.csv', 'undecided', { trials: 64 }],
  // As if the dice were bonds: for the numbers of misreads alone.
  ['weldon-dice.csv', 'compatible', { trials: 12, geometry: 'open-bonds', misread: 0.001, resamples: 99 }]
];

/** Significant digits that tables have, and p-values. */
const [DIGITS, OF_P] = [4, 2];

describe.each(CASES)('numbers of %s, %s', (file, verdict, options) => {
  let d: Diagnosis;
  let html: string;
  let words: string;
  let pdf: { text: string; cells: string[] };
  beforeAll(async () => {
    const read = readCounts(new Uint8Array(readFileSync(`fixtures/${file}`)));
    if (!read.ok) throw new Error(read.problems[0].message);
    // From the file's own bytes, as every way out reads them.
    const made = await diagnose(read.datasets[0].data, { ...defaultOptions, resamples: 499, ...options });
    d = JSON.parse(documentText(made)) as Diagnosis;
    const provenance = createRawSnippet(() => ({ render: () => '<p></p>' }));
    const quote = printedQuote(d, { ...NO_PROVENANCE, sha256: documentSha256(d) });
    html = render(Parts, { props: { diagnosis: d, name: null, quote, quoteAddress: '', provenance } }).body;
    words = textOf(html);
    const bytes = await reportPdf(
      { document: d, documentSha256: 'ab'.repeat(32), provenance: BLIND },
      serverFonts,
      { compress: false }
    );
    const { text, marked } = readPdf(bytes);
    const cells = marked
      .filter(({ tag }) => tag === 'TH' || tag === 'TD')
      .map((cell) => plainSpaces(cell.text));
    pdf = { text, cells };
  });

  it('are those of a case of its kind', () => expect(d.answer.verdict).toBe(verdict));

  it('in the tables of the page are those of the document, rounded to the digits shown', () => {
    const chart = { ceiling: ceilingTable(d), distribution: distributionTable(d), tails: tailsTable(d) };
    for (const [name, wanted] of Object.entries(tablesOf(d))) {
      const source =
        name in chart
          ? render(ChartTable, { props: { table: chart[name as keyof typeof chart], caption: '' } }).body
          : html;
      const rows = rowsOfPage(source);
      const at = rows.findIndex((row) => wanted.heads.every((head, i) => row[i] === head));
      expect(at, name).toBeGreaterThanOrEqual(0);
      // Sentences under the tests have rows of one cell.
      const below = rows.slice(at + 1).filter((row) => row.length > 1);
      expect(
        wrongs(below.slice(0, wanted.rows.length), wanted, name === 'tests' ? OF_P : DIGITS),
        name
      ).toEqual([]);
    }
  });

  it('in the tables of the PDF are the same', () => {
    for (const [name, wanted] of Object.entries(tablesOf(d))) {
      const width = wanted.heads.length + (name === 'tests' ? 1 : 0);
      const rows = rowsOfPdf(pdf.cells, wanted.heads, wanted.rows, width);
      expect(wrongs(rows, wanted, name === 'tests' ? OF_P : DIGITS), name).toEqual([]);
    }
  });

  it('in sentences are those of the document: divergence, floor, variance over ceiling, G²', () => {
    const terminal = plainSpaces(plainText(d, []));
    const one = (text: string, before: string, after = '') =>
      new RegExp(`${before}(${NUMBER})${after}`).exec(text)?.[1] ?? 'nothing';
    for (const text of [words, pdf.text]) {
      expect(unlike(one(text, 'best law lies ', ' nats a shot from the counts'), d.fit.divergence, 3)).toBe(
        ''
      );
      if (!d.fit.certified) expect(unlike(one(text, 'comes closer than ', '\\.'), d.fit.floor, 3)).toBe('');
      const corrected = d.fit.divergenceInterval.value ?? d.fit.divergence;
      expect(unlike(one(text, 'independent-trial law lies ', ' \\(95'), corrected, 2)).toBe('');
      const [ratio] = /The variance is .*? times the ceiling/.exec(text) ?? [''];
      if (d.answer.because.some((reason) => reason.startsWith('The variance is')))
        expect(unlike(one(ratio, 'The variance is '), d.moments.dispersion.value, 3)).toBe('');
    }
    expect(unlike(one(terminal, 'Divergence ', ' nats'), d.fit.divergence, DIGITS)).toBe('');
    expect(unlike(one(terminal, '\\(floor '), d.fit.floor, DIGITS)).toBe('');
    expect(unlike(one(terminal, 'G² = ', '\\.'), d.fit.gSquared, DIGITS)).toBe('');
    const statistic = rowsOfPage(
      render(ChartTable, { props: { table: testsTable(d, TESTS), caption: '' } }).body
    ).filter(([name]) => d.tests.some(({ id }) => TESTS[id] === name));
    d.tests.forEach((test, i) => expect(unlike(statistic[i][1], test.statistic, DIGITS)).toBe(''));
  });

  it('in the explanations are those of the document on page, in the PDF and in the CSV file', () => {
    const ranked = d.explanations?.ranked ?? [];
    expect(ranked.length > 0).toBe(verdict === 'ruled-out');
    const rows = rowsOfPage(html);
    const at = rows.findIndex(([first, second]) => first === 'explanation' && second === 'AIC behind');
    expect(at >= 0).toBe(ranked.length > 0);
    const shown = at < 0 ? [] : rows.slice(at + 1, at + 1 + ranked.length);
    expect(wrongExplanations(shown, ranked, d.engine.alpha)).toEqual([]);
    expect(
      wrongExplanations(explanationsOfPdf(pdf.cells, ranked, d.engine.alpha), ranked, d.engine.alpha)
    ).toEqual([]);
    const lines = Papa.parse<string[]>(documentCsv(d), { skipEmptyLines: true }).data;
    for (const { id, behind, weight, goodness, parameter } of ranked) {
      const value = (item: string) =>
        lines.find(([part, name]) => part === `explanation ${id}` && name === item)?.slice(3) ?? [];
      expect([value('behind')[0], value('weight')[0]].map(Number)).toEqual([behind, weight]);
      expect(value('fit p')[0]).toBe(goodness === null ? '' : String(goodness.p));
      if (parameter)
        expect(value(parameter.symbol).map(Number)).toEqual([parameter.value, parameter.low, parameter.high]);
    }
    for (const words of [d.explanations?.statement, d.explanations?.pairs?.statement])
      if (words) for (const text of [textOf(html), pdf.text]) expect(text).toContain(plainSpaces(words));
  });

  it('of misreads are those of the document on page, in the PDF and in the CSV file', () => {
    const misread = d.nuisances?.misread;
    expect(misread !== undefined).toBe((options.misread ?? 0) > 0);
    const lines = Papa.parse<string[]>(documentCsv(d), { skipEmptyLines: true }).data;
    const told = (item: string) =>
      lines.find(([part, name]) => part === 'misreads' && name === item)?.slice(3);
    expect(told('ceiling') !== undefined).toBe(misread !== undefined);
    if (!misread) return;
    for (const key of ['rate', 'ceiling', 'rawCeiling', 'rawDispersion'] as const)
      expect(told(key)?.[0]).toBe(misread[key] === null ? '' : String(misread[key]));
    for (const [what, sentence] of sayNuisances(d, null))
      for (const text of [textOf(html), pdf.text])
        for (const words of [what, sentence]) expect(text).toContain(plainSpaces(words));
    expect(
      sayNuisances(d, null)
        .map(([, sentence]) => sentence)
        .join(' ')
    ).toMatch(/ceiling/);
  });

  it('in the CSV files are those of the document in full', () => {
    const lines = (csv: string) => Papa.parse<string[]>(csv, { skipEmptyLines: true }).data.slice(1);
    const exact = (cell: string) => (cell === '' ? null : Number(cell));
    const distribution = lines(distributionCsv(d));
    expect(distribution.map((line) => line.slice(3).map(exact))).toEqual(
      d.distribution.map((p) => [p.density, p.shots, p.observed, p.low, p.high, p.fitted])
    );
    expect(distribution.map(([unit, count, closing]) => [unit, Number(count), closing])).toEqual(
      d.distribution.map(({ count, lump }) => [
        d.data.unit === 'pair' ? 'pairs' : 'defects',
        count,
        lump ? 'or more' : ''
      ])
    );
    expect(lines(tailsCsv(d)).map(([, side, ...rest]) => [side, ...rest.map(exact)])).toEqual(
      d.tails.points.map((p) => [
        p.side === 'high' ? 'at least' : 'at most',
        ...[p.count, p.shots, p.observed, p.low, p.high, p.fitted, p.chernoff, p.meanChernoff, p.hoeffding]
      ])
    );
    const all = new Map(
      lines(documentCsv(d)).map(([part, item, , ...values]) => [`${part} ${item}`, values.map(exact)])
    );
    for (const key of ['mean', 'variance', 'third', 'fourth', 'fano', 'dispersion'] as const) {
      const { value, low, high } = d.moments[key];
      expect(all.get(`moments ${key}`), key).toEqual([value, low, high]);
    }
    expect(all.get('moments ceiling')?.[0]).toBe(d.moments.ceiling);
    for (const key of ['divergence', 'floor', 'gSquared', 'logLikelihood'] as const)
      expect(all.get(`fit ${key}`)?.[0], key).toBe(d.fit[key]);
    for (const { id, p, pAdjusted } of d.tests)
      expect([all.get(`test ${id} p`)?.[0], all.get(`test ${id} pAdjusted`)?.[0]]).toEqual([p, pAdjusted]);
  });
});

describe('the comparison itself', () => {
  it('takes numbers apart as they are printed', () => {
    expect(printed('−1 234.50')).toEqual({ value: -1234.5, unit: 0.01, digits: 6 });
    expect(printed('2.5 × 10⁻⁷')).toEqual({ value: 2.5e-7, unit: 1e-8, digits: 2 });
  });
  it('finds a last digit that is off by one, a number cut off, and a value where there is none', () => {
    expect(unlike('4.052', 4.0523, 4)).toBe('');
    expect(unlike('4.053', 4.0523, 4)).not.toBe('');
    expect(unlike('4.05', 4.0523, 4)).not.toBe('');
    expect(unlike('4.052', null, 4)).not.toBe('');
  });
});
