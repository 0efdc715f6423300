import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { beforeAll, describe, expect, it } from 'vitest';
import { anyDiagnosis, WELDON } from '../charts/any-diagnosis';
import { BLIND } from './documents';
import { readPdf, type ReadPdf } from './read-pdf';
import { textOf } from './text-of';

describe('tags', () => {
  let pdf: ReadPdf;
  let objects: string[];
  beforeAll(async () => {
    const document = await anyDiagnosis(WELDON, { trials: 12 });
    const input = {
      document,
      documentSha256: 'ab'.repeat(32),
      provenance: { ...BLIND, link: 'https://a.example/b' }
    };
    pdf = readPdf(await reportPdf(input, serverFonts, { compress: false }));
    objects = [...pdf.objects.values()];
  });
  const elements = (type: string) => objects.filter((object) => new RegExp(`/S /${type}\\n`).test(object));

  it('mark the file as tagged, in English, by its title, and as PDF/UA', () => {
    const catalog = objects.find((object) => /\/Type \/Catalog/.test(object)) ?? '';
    expect(catalog).toMatch(/\/Lang \(en\)/);
    expect(catalog).toMatch(/\/StructTreeRoot \d+ 0 R/);
    expect(objects.some((object) => /\/Marked true/.test(object))).toBe(true);
    expect(objects.some((object) => /\/DisplayDocTitle true/.test(object))).toBe(true);
    expect(objects.some((object) => /<pdfuaid:part>1<\/pdfuaid:part>/.test(object))).toBe(true);
  });

  it('give one title, a heading for each part, and tables with headed rows and columns', () => {
    expect(elements('H1')).toHaveLength(1);
    const headings = pdf.marked.filter(({ tag }) => tag === 'H2').map(({ text }) => text);
    expect(headings).toEqual([
      'How sure',
      'How big',
      'What was given',
      'Counts against the best law',
      'Rate function',
      'Both tails',
      'Cumulants and the ceiling',
      'Tests',
      'What the counts point to',
      'What can look like interaction',
      'Method',
      'Where this result comes from',
      'Cautions'
    ]);
    expect(elements('Table').length).toBe(elements('Caption').length);
    expect(elements('TH').every((object) => /\/Scope \/(Row|Column)/.test(object))).toBe(true);
    expect(elements('TD').length).toBeGreaterThan(50);
  });

  it('describe every chart and formula', () => {
    const charts = elements('Figure').map((object) => textOf(object, 'Alt'));
    expect(charts).toHaveLength(7);
    for (const alt of charts) expect(alt).toMatch(/^Chart of .+\. .+\. Marks: .+\.$/);
    expect(charts[0]).toContain('The best independent-trial law agrees with');
    const formulas = elements('Formula').map((object) => textOf(object, 'Alt'));
    // Trials, ceiling, misread kinks, rate, limit, tails, distance.
    expect(formulas).toHaveLength(7);
    expect(formulas).toContain('kappa 2 is at most mu times 1 minus mu over N');
  });

  it('hang on one tree in the order of reading, each with its parent', () => {
    const all = objects.filter(
      (object) => /\/S \/\w+\n/.test(object) && !/\/Type\b|\/URI/.test(object.split('/K [')[0])
    );
    expect(all.length).toBeGreaterThan(300);
    expect(all.filter((object) => !/\/P \d+ 0 R/.test(object))).toEqual([]);
    expect(all.filter((object) => !/\/K \[/.test(object))).toEqual([]);
    const parents = objects.filter((object) => /\/Nums \[/.test(object)).join('\n');
    expect(parents).not.toContain('null');
  });

  it('make the address a link on its page', () => {
    const link = objects.find((object) => /\/Subtype \/Link/.test(object)) ?? '';
    const action = pdf.objects.get(Number(link.match(/\/A (\d+) 0 R/)?.[1]));
    expect(action).toContain('/URI (https://a.example/b)');
    expect(textOf(link, 'Contents')).toBe('Open https://a.example/b');
    expect(elements('Link')[0]).toMatch(/\/Type \/OBJR/);
    expect(objects.filter((object) => /\/Tabs \/S/.test(object))).toHaveLength(pdf.pages);
  });

  it('stand beside an outline of all parts', () => {
    const titles = objects
      .filter((object) => /\/Dest \[/.test(object))
      .map((object) => textOf(object, 'Title'));
    expect(titles[0]).toBe('The answer');
    expect(titles).toHaveLength(12);
    expect(objects.filter((object) => /\/XYZ (?!0 )/.test(object))).toEqual([]);
  });

  it('come with fonts that are all in the file', () => {
    const fonts = objects.filter((object) => /\/Type \/FontDescriptor/.test(object));
    expect(fonts.length).toBeGreaterThan(3);
    expect(fonts.filter((object) => !/\/FontFile2 \d+ 0 R/.test(object))).toEqual([]);
    expect(objects.filter((object) => /\/Subtype \/Type1\b/.test(object))).toEqual([]);
  });
});
