import { documentCsv } from '$lib/model/document-csv';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../support/saved-reports';

const linesOf = (csv: string) =>
  Papa.parse<Record<string, string>>(csv, { header: true, skipEmptyLines: true });

describe('documentCsv', () => {
  it('holds the numbers of the document in full', async () => {
    const { document } = await diagnoseInvented();
    const { data, errors } = linesOf(documentCsv(document));
    const line = (part: string, item: string, count = '') =>
      data.find((one) => one.part === part && one.item === item && one.count === count)!;
    expect(errors).toEqual([]);
    expect(line('answer', 'verdict').value).toBe(document.answer.verdict);
    expect(Number(line('moments', 'variance').value)).toBe(document.moments.variance.value);
    expect(Number(line('moments', 'variance').high)).toBe(document.moments.variance.high);
    for (const { id, p } of document.tests) expect(Number(line(`test ${id}`, 'p').value)).toBe(p);
    for (const { count, fitted } of document.distribution)
      expect(Number(line('distribution', 'fitted', String(count)).value)).toBe(fitted);
    expect(data.filter((one) => one.part === 'high tail' || one.part === 'low tail')).toHaveLength(
      5 * document.tails.points.length
    );
  });

  it('leaves empty what the document has as null', async () => {
    const { document } = await diagnoseInvented({ misread: null });
    expect(documentCsv(document)).toContain('\r\ndata,misread,,,,\r\n');
  });

  it('does not let an engine that an imported document names become a formula or a second line', async () => {
    const { document } = await diagnoseInvented();
    document.engine.version = '=1+1,"a"\n';
    const { data } = linesOf(documentCsv(document));
    expect(data.find((one) => one.item === 'version')!.value).toBe(`'=1+1,"a"\n`);
  });
});
