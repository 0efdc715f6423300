import { alignedColumn } from '$lib/charts/aligned-column';
import { answersTitle } from '$lib/charts/answers-title';
import { ratioTitle } from '$lib/charts/ratio-title';
import { sweepDispersionTitle } from '$lib/charts/sweep-dispersion-title';
import { sweepTable } from '$lib/charts/sweep-table';
import { sweepTitle, windowsTitle } from '$lib/charts/sweep-titles';
import { sweepPdf } from '$lib/pdf/sweep-pdf';
import type { SweepPdfInput } from '$lib/pdf/sweep-input';
import { serverFonts } from '$lib/server/pdf/fonts';
import { sweepReport } from '$lib/stats/sweep/sweep-report';
import type { SweepReport } from '$lib/stats/sweep/types';
import { beforeAll, describe, expect, it } from 'vitest';
import { drawn, landauZenerPmf, quenchTimes } from '../stats/sweep/simulated';
import { plainSpaces, readPdf, type ReadPdf } from './read-pdf';
import { READER, textOfPdf } from './text-of-pdf';

/** A sweep of invented datasets over two decades; every third is diagnosed. */
const swept = (points: number, axis: 'quench-time' | 'hold-time'): SweepReport => {
  const times = quenchTimes(points);
  const counts = drawn(times.map(landauZenerPmf), 5000, 1);
  return sweepReport(
    times.map((time, i) => ({
      label: `ramp ${i + 1} <ö>`,
      time,
      counts: counts[i],
      dataset: {
        id: `${i}`,
        digest: '',
        verdict: i % 3 ? null : 'compatible',
        dispersion: i % 3 ? null : { value: 0.5, low: 0.4, high: 0.6 }
      }
    })),
    {
      axis,
      timeUnit: 'µs',
      unit: 'pair',
      window: null,
      transition: { dimension: 1, correlation: 1, dynamic: 1 },
      alpha: 0.05
    }
  );
};

const inputOf = (document: SweepReport): SweepPdfInput => ({
  document,
  documentSha256: 'ab'.repeat(32),
  engineVersion: '0.1.0',
  name: 'Two decades & more',
  notes: 'First night.',
  madeBy: 'Ada Invented',
  madeAt: new Date(Date.UTC(2026, 11, 1, 16, 5)),
  team: 'Wrackline Bay',
  sources: document.points.map(({ label }, i) => ({
    name: label,
    device: 'Kelp',
    firmware: null,
    group: null,
    digest: `sha256:${String(i).padStart(12, '0')}ffff`
  })),
  link: 'https://counts.example/team/bay/sweeps/1'
});

describe.each([
  ['nine quench times', 9, 'quench-time'],
  ['nine hold times', 9, 'hold-time'],
  ['a hundred quench times', 100, 'quench-time']
] as const)('the PDF of a sweep of %s', (_, points, axis) => {
  const document = swept(points, axis);
  let bytes: Uint8Array;
  let pdf: ReadPdf;
  let text: string;
  beforeAll(async () => {
    bytes = await sweepPdf(inputOf(document), serverFonts, { compress: false });
    pdf = readPdf(bytes);
    text = plainSpaces(pdf.text);
  });

  it(`can be read by ${READER}`, async () => {
    const printed = textOfPdf(await sweepPdf(inputOf(document), serverFonts), 'lines');
    expect(printed).toContain('Two decades & more');
    expect(printed).toContain('ramp 1 <ö>');
  });

  it('says the answer as its title, what it rests on, and every caution twice', () => {
    expect(pdf.marked.filter(({ tag }) => tag === 'H1').map((one) => plainSpaces(one.text).trim())).toEqual([
      plainSpaces(document.statement)
    ]);
    for (const line of document.because) expect(text).toContain(plainSpaces(line));
    for (const line of document.cautions) expect(text.split(plainSpaces(line))).toHaveLength(3);
  });

  it('has every chart with its finding', () => {
    const titles = [
      sweepTitle(document),
      windowsTitle(document),
      answersTitle(document),
      sweepDispersionTitle(document),
      ...document.steady.map((one) => ratioTitle(one, document))
    ];
    expect(document.steady).toHaveLength(axis === 'hold-time' ? 3 : 2);
    for (const title of titles) expect(text).toContain(plainSpaces(title));
    expect(pdf.marked.filter(({ tag }) => tag === 'Figure').length).toBeGreaterThanOrEqual(titles.length);
  });

  it('has the numbers of the datasets, or says which rows it leaves out, and where each comes from', () => {
    const cells = new Set(
      pdf.marked.filter(({ tag }) => ['TH', 'TD'].includes(tag)).map((one) => plainSpaces(one.text).trim())
    );
    const table = sweepTable(document);
    const columns = table.columns.map(({ kind }, i) =>
      alignedColumn(
        table.rows.map((row) => row[i]),
        kind
      )
    );
    const last = table.rows.length - 1;
    for (const row of points === 9 ? table.rows.keys() : [0, last])
      for (const column of columns) expect(cells).toContain(plainSpaces(column[row]).trim());
    if (points > 40) expect(text).toMatch(/Every third row\. The document and the CSV files have all 100\./);
    for (let i = 0; i < points; i++) expect(text).toContain(String(i).padStart(12, '0'));
  });

  it('is the same bytes again, and says nothing of people, team or datasets where they are kept back', async () => {
    const again = await sweepPdf(inputOf(document), serverFonts, { compress: false });
    expect(Buffer.compare(again, bytes)).toBe(0);
    const nobody = {
      name: null,
      notes: null,
      madeBy: null,
      madeAt: null,
      team: null,
      sources: null,
      link: null
    };
    const blind = await sweepPdf({ ...inputOf(document), ...nobody }, serverFonts, { compress: false });
    const said = plainSpaces(readPdf(blind).text) + Buffer.from(blind).toString('latin1');
    const told = [
      'Ada Invented',
      'Wrackline',
      'Kelp',
      'First night',
      'counts.example',
      'Two decades',
      'D:2026'
    ];
    expect(told.filter((words) => said.includes(words))).toEqual([]);
    expect(told.filter((words) => (text + Buffer.from(bytes).toString('latin1')).includes(words))).toEqual(
      told
    );
  });
});
