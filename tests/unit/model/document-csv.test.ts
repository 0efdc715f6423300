import { documentCsv } from '$lib/model/document-csv';
import type { CountData } from '$lib/stats/types';
import Papa from 'papaparse';
import { describe, expect, it } from 'vitest';
import { diagnoseInvented } from '../../support/saved-reports';

/** Invented: shots of two kinds, of few defects and of many. */
const TWO_KINDS: CountData = {
  kind: 'histogram',
  counts: [300, 200, 60, 10, 5, 20, 70, 150, 90, 30].map((shots, count) => [count, shots]),
  lump: null
};

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

  it('holds every number of the explanations, and none where no story was told', async () => {
    // Far more scatter than equal trials: half of the shots of another kind.
    const { document } = await diagnoseInvented({ trials: 12, resamples: 199 }, TWO_KINDS);
    const { data } = linesOf(documentCsv(document));
    const { ranked, separate, tieWithin } = document.explanations!;
    const told = (part: string, item: string) => data.find((one) => one.part === part && one.item === item)!;
    expect(ranked.length).toBeGreaterThan(4);
    expect(data.filter(({ item }) => item === 'behind').map(({ part }) => part)).toEqual(
      ranked.map(({ id }) => `explanation ${id}`)
    );
    for (const { id, parameter, second, goodness, ...rest } of ranked) {
      const part = `explanation ${id}`;
      for (const key of ['logLikelihood', 'parameters', 'aic', 'behind', 'weight', 'gSquared'] as const)
        expect(Number(told(part, key).value)).toBe(rest[key]);
      expect(told(part, 'base').value).toBe(rest.base === null ? '' : String(rest.base));
      if (parameter)
        expect(['value', 'low', 'high'].map((key) => Number(told(part, parameter.symbol)[key]))).toEqual([
          parameter.value,
          parameter.low,
          parameter.high
        ]);
      if (second) expect(Number(told(part, second.symbol).value)).toBe(second.value);
      expect(told(part, 'fit p').value).toBe(goodness === null ? '' : String(goodness.p));
    }
    expect(Number(told('explanations', 'tieWithin').value)).toBe(tieWithin);
    expect(data.filter(({ item }) => item.startsWith('shots to separate'))).toHaveLength(separate.length);
    const calm = await diagnoseInvented();
    expect(calm.document.explanations).toBeUndefined();
    expect(documentCsv(calm.document)).not.toContain('explanation');
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
