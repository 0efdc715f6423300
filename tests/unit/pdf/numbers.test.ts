import { readCounts } from '$lib/formats/read-counts';
import { documentCsv } from '$lib/model/document-csv';
import { readDocument } from '$lib/model/read-document';
import { reportPdf } from '$lib/pdf/report-pdf';
import { serverFonts } from '$lib/server/pdf/fonts';
import { defaultOptions } from '$lib/stats/default-options';
import { diagnose } from '$lib/stats/diagnose';
import type { DiagnoseOptions, Diagnosis } from '$lib/stats/types';
import { readFileSync } from 'node:fs';
import Papa from 'papaparse';
import { beforeAll, describe, expect, it } from 'vitest';
import { BLIND } from './documents';
import { plainSpaces } from './read-pdf';
import { isApart, isUnseen, PARTS, printed, tablesOfPage } from './tables-of-page';
import { READER, textOfPdf } from './text-of-pdf';
import { NONE, TOLD, ways, wordsBefore } from './ways-to-print';

const kept = (name: string) => async (): Promise<Diagnosis> => {
  const read = readDocument(readFileSync(`fixtures/guide/${name}.json`, 'utf8'));
  if (!read.ok) throw new Error(`${name} does not read.`);
  return read.diagnosis;
};
const made = (file: string, options: Partial<DiagnoseOptions>) => (): Promise<Diagnosis> => {
  const read = readCounts(new Uint8Array(readFileSync(`fixtures/${file}`)));
  if (!read.ok) throw new Error(read.problems[0].message);
  return diagnose(read.datasets[0].data, { ...defaultOptions, resamples: 199, ...options });
};

/** Ruled out, with explanations; dice; shots in order, in batches; kinks as read, at a rate with an uncertainty. */
const CASES: [name: string, make: () => Promise<Diagnosis>][] = [
  ['bunched sites', kept('bunched-sites')],
  ['dice', made('weldon-dice.csv', { trials: 12 })],
  ['drifting shots', made('demo/drifting-shots.csv', { trials: 100 })],
  [
    'kinks on an open chain',
    made('demo/misread-kinks.csv', {
      ...{ trials: 50, geometry: 'open-bonds', misread: 0.01, misreadUncertainty: 0.001 }
    })
  ]
];

const literal = (text: string) => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

describe.each(CASES)(`the PDF of %s, read by ${READER}`, (_name, make) => {
  let document: Diagnosis;
  let bytes: Uint8Array;
  let text: string;
  let sentences: string;
  beforeAll(async () => {
    document = await make();
    bytes = await reportPdf({ document, documentSha256: 'ab'.repeat(32), provenance: BLIND }, serverFonts);
    text = textOfPdf(bytes, 'lines');
    sentences = textOfPdf(bytes, 'columns');
  });

  const has = (number: string, before = '', where = text) =>
    new RegExp(`${before}(?<![\\d.])(?:${number})(?!\\d|\\.\\d)`).test(where);

  it('has every row of every table of the page, to the digit', () => {
    const missing: string[] = [];
    let [found, unseen] = [0, 0];
    for (const [kind, table] of tablesOfPage(document)) {
      const whole = table.columns.map((_, i) => i);
      const parts = PARTS[kind] ?? [whole];
      if (kind === 'explanations') expect(parts.flat().sort()).toEqual([0, ...whole].sort());
      for (const row of printed(table).filter((one) => !isApart(kind, one)))
        for (const part of parts) {
          const words = part.map((i) => row[i]).join(' ');
          if (text.includes(words.trim())) found++;
          else if (isUnseen(kind, row) && table.rows.length > 40) unseen++;
          else missing.push(`${kind}: ${words}`);
        }
    }
    expect(missing).toEqual([]);
    expect(found).toBeGreaterThan(70);
    expect(unseen > 0).toBe(text.includes('Rows neither seen nor expected are left out.'));
  });

  it('has every number of the CSV file of all numbers, but for counts never seen', () => {
    const missing: string[] = [];
    let found = 0;
    const lines = Papa.parse<string[]>(documentCsv(document), { skipEmptyLines: true }).data.slice(1);
    for (const [part, item, count, ...cells] of lines) {
      // Those of single counts are rows of the tables above.
      if (count !== '' && part !== 'certificate') continue;
      for (const cell of cells.filter((one) => one !== '' && Number.isFinite(Number(one)))) {
        const name = `${part}, ${item}`;
        if (NONE.includes(name) && cell === '0') continue;
        // Rows of a table that begins with the number itself are found above.
        if (/^(N|batch|misread rate) /.test(part)) continue;
        const told = name in TOLD;
        const before = told ? TOLD[name] : /^-?\d{1,2}$/.test(cell) ? wordsBefore(part, item) : null;
        const after = before === null ? '' : `${literal(before)} (?:[^ ]+ ){0,40}?\\(?`;
        const [least, where] = told ? [2, sentences] : [4, text];
        const there = before !== '' && ways(Number(cell), least).some((way) => has(way, after, where));
        if (there) found++;
        else missing.push(`${name}: ${cell}`);
      }
    }
    expect(missing).toEqual([]);
    expect(found).toBeGreaterThan(70);
  });

  it('has every trial of the best law in its list, and every count that was seen with its shots', () => {
    const { levels } = document.fit;
    for (const { p, trials } of levels.filter((level) => level.trials > 0))
      expect(
        ways(p, 4).some((way) => has(way, `trials ${trials} `)),
        `${trials} of ${p}`
      ).toBe(true);
    for (const { count, shots, observed } of document.distribution.filter((point) => point.shots > 0)) {
      const [many] = ways(shots, 9);
      expect(
        ways(observed, 4).some((way) => has(way, `(?<!\\d)${count}\\+? ${many} `)),
        `${count}`
      ).toBe(true);
    }
  });

  it('has the answer, and every sign of its formulas and terms', () => {
    expect(sentences).toContain(plainSpaces(document.answer.statement));
    const signs = 'κ₁ κ₂ κ₃ κ₄ μ ρ θ ∑ ∏ Î ≤ ≥ ∼ × − – ’ ⁻ G²'.split(' ');
    expect(signs.filter((sign) => !text.includes(sign))).toEqual([]);
  });

  it('has none of numbers that are not its own, and misses one that is changed by a digit', () => {
    for (const strange of [31.41592653, -27.1828, 0.0061803399])
      expect(ways(strange, 3).some((way) => has(way))).toBe(false);
    const { logLikelihood, gSquared } = document.fit;
    for (const own of [logLikelihood, gSquared]) {
      const [four] = ways(Number(own.toPrecision(5)), 9);
      expect(
        ways(own, 4).some((way) => has(way)),
        four
      ).toBe(true);
      expect(
        ways(own * 1.0123, 4).some((way) => has(way)),
        four
      ).toBe(false);
    }
  });

  it('has the same bytes a second time, under 300 kB', async () => {
    const input = { document, documentSha256: 'ab'.repeat(32), provenance: BLIND };
    expect(Buffer.compare(await reportPdf(input, serverFonts), bytes)).toBe(0);
    expect(bytes.length).toBeLessThan(300_000);
  });
});
