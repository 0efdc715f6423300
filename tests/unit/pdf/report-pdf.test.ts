import { alignedColumn } from '$lib/charts/aligned-column';
import { ceilingTable } from '$lib/charts/ceiling-table';
import { ceilingTitle } from '$lib/charts/ceiling-title';
import { certificateWords } from '$lib/charts/certificate-words';
import { cumulantsTable } from '$lib/charts/cumulants-table';
import { distributionTable } from '$lib/charts/distribution-table';
import { distributionTitle } from '$lib/charts/distribution-title';
import { explanationsTitle } from '$lib/charts/explanations-title';
import { levelsTable } from '$lib/charts/levels-table';
import { rateTable } from '$lib/charts/rate-table';
import { rateTitle } from '$lib/charts/rate-title';
import { referencesTable } from '$lib/charts/references-table';
import type { Table } from '$lib/charts/table';
import { tailsTable } from '$lib/charts/tails-table';
import { tailsTitle } from '$lib/charts/tails-title';
import { testsTitle } from '$lib/charts/tests-title';
import { documentText } from '$lib/model/document-text';
import { EXPLANATIONS, FLAGS, TESTS, VERDICTS } from '$lib/model/labels';
import { sayData } from '$lib/model/plain-text/say-data';
import { sayFlags } from '$lib/model/plain-text/say-flags';
import { sayTests } from '$lib/model/plain-text/say-tests';
import { howBig } from '$lib/model/report/how-big';
import { sayNuisances } from '$lib/model/report/say-nuisances';
import { sayOwnNumber } from '$lib/model/report/say-own-number';
import { sayShotsInAll, sayShotsToLead } from '$lib/model/report/say-shots-in-all';
import { whatElse } from '$lib/model/report/what-else';
import { sayHowOften } from '$lib/model/say-p';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import type { Diagnosis } from '$lib/stats/types';
import { createHash } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import { BLIND, DOCUMENTS } from './documents';
import { plainSpaces, readPdf, type ReadPdf } from './read-pdf';

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');
const inputOf = (document: Diagnosis) => ({
  document,
  documentSha256: sha256(documentText(document)),
  provenance: BLIND
});

/** Everything that is said of explanations, in words; nothing where none were told. */
const explained = ({ explanations, engine }: Diagnosis): string[] => {
  if (!explanations) return [];
  const { ranked, tied, separate, shotsToLead, notRun, pairs, statement } = explanations;
  return [
    statement,
    pairs?.statement ?? '',
    explanationsTitle(explanations, engine.alpha),
    ...ranked.flatMap((one) => [EXPLANATIONS[one.id], sayOwnNumber(one)]),
    ...ranked.filter(({ id }) => tied.includes(id)).map(({ meaning }) => meaning),
    ...separate.flatMap(({ measurement, shots }) => [measurement, sayShotsInAll(shots)]),
    sayShotsToLead(EXPLANATIONS[ranked[0].id], shotsToLead),
    ...notRun.map(({ reason }) => reason)
  ];
};

/** Rows of a table as they are printed. */
const printed = (table: Table): string[] => {
  const columns = table.columns.map(({ kind }, i) =>
    alignedColumn(
      table.rows.map((row) => row[i]),
      kind
    )
  );
  return table.rows.map((_, row) => plainSpaces(columns.map((column) => column[row].trim()).join(' ')));
};

/** Rows of all tables of the PDF, cells in a line. */
const rowsOf = ({ marked }: ReadPdf): string =>
  plainSpaces(
    marked
      .filter(({ tag }) => ['TH', 'TD'].includes(tag))
      .map(({ text }) => text.trim())
      .join(' ')
  );

describe.each(DOCUMENTS)('report of %s', (name, make) => {
  let document: Diagnosis;
  let bytes: Uint8Array;
  let plain: Uint8Array;
  let pdf: ReadPdf;
  beforeAll(async () => {
    document = await make();
    bytes = await reportPdf(inputOf(document), serverFonts);
    plain = await reportPdf(inputOf(document), serverFonts, { compress: false });
    pdf = readPdf(plain);
  });

  it('has the same bytes a second time, in under a second of work and under 300 kB', async () => {
    const seconds: number[] = [];
    for (let i = 0; i < 2; i++) {
      const before = process.cpuUsage();
      const again = await reportPdf(inputOf(document), serverFonts);
      const { user, system } = process.cpuUsage(before);
      seconds.push((user + system) / 1e6);
      expect(Buffer.compare(bytes, again)).toBe(0);
    }
    expect(bytes.length).toBeLessThan(300_000);
    // Work of this process alone, and the quicker of two, so that what else the machine does hardly counts.
    expect(Math.min(...seconds)).toBeLessThan(1);
  });

  it('ends with cautions that begin on the page of the part before', () => {
    const heads = pdf.marked.filter(({ tag }) => tag === 'H2');
    const [before, last] = heads.slice(-2);
    expect(plainSpaces(last.text)).toBe('Cautions');
    expect(before.page).toBe(last.page);
  });

  it('lets others have their turn while it is made', async () => {
    let turns = 0;
    const counting = setInterval(() => turns++, 0);
    await reportPdf(inputOf(document), serverFonts);
    clearInterval(counting);
    // One after each part but the answer.
    expect(turns).toBeGreaterThanOrEqual(8);
  });

  it('answers on the first page: verdict, statement, how sure, how big, what else, and the counts', () => {
    const first = pdf.marked.filter(({ page }) => page === 0);
    const text = plainSpaces(first.map((marked) => marked.text).join(' '));
    expect(text).toContain(VERDICTS[document.answer.verdict]);
    const said = [
      document.answer.statement,
      ...document.answer.because,
      ...howBig(document),
      ...whatElse(document).map(({ words }) => words),
      distributionTitle(document)
    ];
    for (const words of said) expect(text).toContain(plainSpaces(words));
    expect(first.filter(({ tag }) => tag === 'Figure')).toHaveLength(1);
  });

  it('says every title, flag, test, caution and digest', () => {
    const titles = [rateTitle, tailsTitle, ceilingTitle].map((title) => title(document));
    if (document.tests.length > 0) titles.push(testsTitle(document));
    const flags = document.flags.flatMap((flag) => [
      FLAGS[flag.id],
      flag.statement,
      flag.size,
      ...flag.otherCauses,
      ...flag.next
    ]);
    const tests = document.tests.map(({ p, smallestP }) => sayHowOften(p, smallestP));
    const notRun = document.notRun.map(({ id, reason }) => `${TESTS[id]}: ${reason}`);
    for (const words of [
      ...sayNuisances(document, null).flat(),
      ...titles,
      ...flags,
      ...tests,
      ...notRun,
      ...explained(document),
      ...document.cautions,
      certificateWords(document)
    ])
      expect(pdf.text).toContain(plainSpaces(words));
    // Digests are cut where the column ends.
    const unbroken = pdf.text.replaceAll(' ', '');
    expect(unbroken).toContain(document.data.digest);
    expect(unbroken).toContain(`sha256:${sha256(documentText(document))}`);
  });

  it('prints tables to the digit that the page shows', () => {
    const rows = rowsOf(pdf);
    const tables = [cumulantsTable, ceilingTable, levelsTable, referencesTable];
    const long = [distributionTable, rateTable, tailsTable];
    for (const table of [...tables, ...long].map((make) => make(document)))
      if (table.rows.length <= 40) for (const row of printed(table)) expect(rows).toContain(row);
  });

  it('has every number that plain text says of data, tests and flags', () => {
    // The certificate's bound is a share of shots on the page: "1 in 2 400".
    const tests = { ...document, tails: { ...document.tails, certificate: null } };
    const text = [sayData(document, []), sayTests(tests), sayFlags(document.flags)].join('\n');
    const numbers = plainSpaces(text).match(/(?<![\w:.])\d[\d ]*(?:\.\d+)?(?: × 10[⁻⁰-⁹¹²³]+)?/g) ?? [];
    expect(numbers.length).toBeGreaterThan(8);
    for (const number of numbers) expect(pdf.text).toContain(number.trim());
  });

  it('is numbered n of m on every page', () => {
    const feet = pdf.marked.filter(({ tag, text }) => tag === 'Artifact' && / of /.test(text));
    const own = feet.filter(({ page, text }) => text.endsWith(`${page + 1} of ${pdf.pages}`));
    expect(new Set(own.map(({ page }) => page)).size).toBe(pdf.pages);
    expect(pdf.pages, name).toBeLessThan(16);
  });

  it('draws no text outside its tags, and no sign without a glyph', () => {
    expect(pdf.unmarked).toEqual([]);
    expect(pdf.text).not.toMatch(/[\ufffd\0]/);
    for (const { tag, page } of pdf.marked) expect([tag, page]).not.toContain('');
  });
});
