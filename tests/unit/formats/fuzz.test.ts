import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { choices } from '$lib/formats/choices';
import { readCounts } from '$lib/formats/read-counts';
import { readProbabilities } from '$lib/formats/read-probabilities';
import type { Dataset, Problem, ReadOptions } from '$lib/formats/types';

const valid = ['', 'demo/', 'bad/'].flatMap((folder) =>
  readdirSync(`fixtures/${folder}`)
    .filter((name) => /\.(csv|json)$/.test(name))
    .map((name) => new Uint8Array(readFileSync(`fixtures/${folder}${name}`)).slice(0, 2000))
);
const byte = fc.integer({ min: 0, max: 255 });
/** A real file with some bytes replaced, taken out or put in. */
const mutated = fc
  .tuple(
    fc.constantFrom(...valid),
    fc.array(fc.tuple(fc.nat(2000), fc.constantFrom('replace', 'remove', 'insert'), byte), { maxLength: 6 })
  )
  .map(([file, edits]) => {
    const bytes = [...file];
    for (const [place, kind, value] of edits) {
      const at = place % (bytes.length + 1);
      if (kind === 'insert') bytes.splice(at, 0, value);
      else bytes.splice(at, 1, ...(kind === 'replace' ? [value] : []));
    }
    return Uint8Array.from(bytes);
  });
const pieces = [
  '0',
  '1',
  '12',
  '1 000',
  '1.5',
  '-3',
  'NaN',
  '10+',
  'count',
  'shots',
  'batch',
  'device',
  'total',
  ',',
  ',',
  ';',
  '\t',
  ' ',
  '\n',
  '\n',
  '\r\n',
  '"',
  '#',
  '{',
  '}',
  '[',
  ']',
  ':',
  '"0"',
  'é',
  '\u2028',
  '\ud800',
  '+',
  '≥'
];
const tableLike = fc.array(fc.constantFrom(...pieces), { maxLength: 40 }).map((parts) => parts.join(''));
const options: fc.Arbitrary<ReadOptions> = fc.record(
  {
    format: fc.constantFrom('auto' as const, ...choices.format.map(({ value }) => value)),
    separator: fc.constantFrom(...choices.separator.map(({ value }) => value)),
    header: fc.boolean(),
    decimal: fc.constantFrom('.' as const, ',' as const),
    thousands: fc.constantFrom('.' as const, ',' as const, 'none' as const),
    trials: fc.constantFrom(null, 0, 1, 12),
    columns: fc.array(
      fc.record({
        column: fc.oneof(fc.integer({ min: -1, max: 4 }), fc.constantFrom('count', 'device', '')),
        role: fc.constantFrom(...choices.role.map(({ value }) => value))
      }),
      { maxLength: 3 }
    )
  },
  { requiredKeys: [] }
);

function holdsDataset({ data, name }: Dataset, { trials = null }: ReadOptions): void {
  expect(name).not.toBe('');
  if (data.kind === 'shots') {
    expect(data.shots.length).toBeGreaterThan(0);
    expect(data.batches?.length ?? data.shots.length).toBe(data.shots.length);
    if (trials !== null) expect(Math.max(...data.shots)).toBeLessThanOrEqual(trials);
    return;
  }
  const counts = data.counts.map(([count]) => count);
  expect(counts).toEqual([...new Set(counts)].sort((a, b) => a - b));
  const shots = [...data.counts.map(([, number]) => number), data.lump?.shots ?? 0];
  for (const value of [...counts, ...shots]) expect(Number.isInteger(value) && value >= 0).toBe(true);
  const sum = shots.reduce((total, number) => total + number, 0);
  expect(sum).toBeGreaterThan(0);
  expect(sum).toBeLessThanOrEqual(2 ** 53);
  if (data.lump) expect(data.lump.from).toBeGreaterThan(Math.max(-1, ...counts));
  if (trials !== null) expect(Math.max(...counts, data.lump?.from ?? 0)).toBeLessThanOrEqual(trials);
}

function holdsProblems(problems: Problem[], text: string | null): void {
  expect(problems.length).toBeGreaterThan(0);
  expect(problems.length).toBeLessThanOrEqual(20);
  const lines = text?.replace(/^\ufeff/, '').split(/\r\n?|\n/);
  for (const { line, column, message, fix } of problems) {
    expect(message.length > 5 && fix.length > 5).toBe(true);
    if (!lines || line === null) continue;
    expect(line).toBeGreaterThanOrEqual(1);
    expect(line).toBeLessThanOrEqual(lines.length);
    if (column === null) continue;
    expect(column).toBeGreaterThanOrEqual(1);
    expect(column).toBeLessThanOrEqual(lines[line - 1].length + 1);
  }
}

function check(input: Uint8Array | string, chosen: ReadOptions): void {
  const result = readCounts(input, chosen);
  if (result.ok) {
    expect(result.datasets.length).toBeGreaterThan(0);
    for (const dataset of result.datasets) holdsDataset(dataset, chosen);
  } else holdsProblems(result.problems, typeof input === 'string' ? input : null);
}

describe('whatever is given, there are datasets or problems, and never a crash', () => {
  it('random bytes', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), options, (bytes, chosen) => {
        check(bytes, chosen);
        readProbabilities(bytes);
      }),
      { numRuns: 1500 }
    );
  });

  it('real files with bytes changed', () => {
    fc.assert(fc.property(mutated, options, check), { numRuns: 3000 });
  });

  it('pieces of tables and of JSON', () => {
    fc.assert(fc.property(tableLike, options, check), { numRuns: 6000 });
  });

  it('any text, also as probabilities', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), options, (text, chosen) => {
        check(text, chosen);
        const result = readProbabilities(text);
        if (result.ok) expect(result.probabilities.every((p) => p >= 0 && p <= 1)).toBe(true);
        else holdsProblems(result.problems, text);
      }),
      { numRuns: 1500 }
    );
  });
});

describe('a histogram written in any of the forms reads back the same', () => {
  const histograms = fc
    .uniqueArray(fc.tuple(fc.nat(5000), fc.nat(10_000_000)), {
      minLength: 1,
      maxLength: 30,
      selector: ([count]) => count
    })
    .map((rows) => rows.sort((a, b) => a[0] - b[0]))
    .filter((rows) => rows.some(([, shots]) => shots > 0));
  const grouped = (value: number) => value.toLocaleString('en').replaceAll(',', '\u202f');
  const write: Record<string, (rows: [number, number][]) => string> = {
    comma: (rows) => `count,shots\n${rows.map((row) => row.join(',')).join('\n')}\n`,
    semicolon: (rows) => rows.map((row) => row.map(grouped).join(';')).join('\r\n'),
    tab: (rows) => `Anzahl\tHäufigkeit\n${rows.map((row) => row.join('\t')).join('\n')}`,
    spaces: (rows) => `kinks   shots\n${rows.map(([count, shots]) => `  ${count}    ${shots}`).join('\n')}`,
    exponents: (rows) =>
      `n,shots\n${rows.map((row) => row.map((value) => value.toExponential()).join(',')).join('\n')}`,
    object: (rows) => JSON.stringify({ counts: Object.fromEntries(rows) }),
    pairs: (rows) => JSON.stringify(rows, null, 1)
  };

  it.each(Object.keys(write))('%s', (form) => {
    fc.assert(
      fc.property(histograms, (rows) => {
        const result = readCounts(write[form](rows));
        expect(result.ok && result.datasets.map(({ data }) => data)).toEqual([
          { kind: 'histogram', counts: rows, lump: null }
        ]);
      })
    );
  });
});
