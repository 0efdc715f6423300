import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { choices, withRole } from '$lib/formats/choices';
import { readCounts } from '$lib/formats/read-counts';
import { datasets, histogram, problems } from './support';

const file = (name: string) => readFileSync(`fixtures/${name}`);

describe('public data', () => {
  // Numbers of shots as science.md section 11 gives them; each file names its source.
  it.each([
    ['weldon-dice.csv', 26306, [185, 1149, 3265, 5475, 6114, 5194, 3067, 1331, 403, 105, 14, 4, 0]],
    ['rutherford-geiger.csv', 2608, [57, 203, 383, 525, 532, 408, 273, 139, 45, 27, 10, 4, 0, 1, 1]],
    ['horse-kicks.csv', 200, [109, 65, 22, 3, 1]],
    ['yeast-square-a.csv', 400, [213, 128, 37, 18, 3, 1]],
    ['greenwood-yule.csv', 647, [447, 132, 42, 21, 3, 2]]
  ])('%s', (name, total, shots) => {
    const { counts, lump } = histogram(file(name));
    expect(counts).toEqual(shots.map((number, count) => [count, number]));
    expect(lump).toBeNull();
    expect(shots.reduce((sum, number) => sum + number, 0)).toBe(total);
  });

  it('weldon-dice-lumped.csv has its last three counts in one row', () => {
    const { counts, lump } = histogram(file('weldon-dice-lumped.csv'));
    expect(lump).toEqual({ from: 10, shots: 18 });
    expect(counts).toEqual(histogram(file('weldon-dice.csv')).counts.slice(0, 10));
  });
});

describe('invented data of the demonstration', () => {
  it.each(readdirSync('fixtures/demo'))('%s is read without a remark but the usual', (name) => {
    const result = readCounts(file(`demo/${name}`));
    expect(result.ok).toBe(true);
    expect(result.ok && result.notes.filter((note) => !note.startsWith('One column'))).toEqual([]);
  });

  it('firmware versions are datasets of their own', () => {
    expect(datasets(file('demo/firmware-versions.csv')).map(({ conditions }) => conditions.firmware)).toEqual(
      ['ebb 3.1', 'ebb 3.2', 'ebb 3.3', 'ebb 3.4']
    );
  });
});

describe('bad files', () => {
  it.each([
    ['negative.csv', ['3:3 "-3" is negative.']],
    ['fractional.csv', ['3:1 "1.5" is not a whole number.', '4:3 "4.25" is not a whole number.']],
    [
      'not-a-number.csv',
      ['3:3 "NaN" is no number.', '4:3 "many" is not a number.', '5:3 "inf" is infinite.']
    ],
    ['repeated.csv', ['6:1 The count 1 is given twice: here and on line 4.']],
    [
      'ragged.csv',
      [
        '3:6 This row has 3 cells where the others have 2.',
        '4:2 This row has 1 cell where the others have 2.'
      ]
    ],
    ['no-shots.csv', ['2:null There are no shots: every number of shots is zero.']],
    ['header-only.csv', ['1:null There is a header and no row under it.']],
    ['empty.csv', ['1:null The file is empty.']],
    [
      'too-many-shots.csv',
      ['3:1 With this row the numbers of shots add up to more than 2^53: they are no longer exact.']
    ],
    [
      'wrong-total.csv',
      ['4:7 This row says that there are 580 shots in total, but the others add up to 579.']
    ],
    [
      'unknown-columns.csv',
      ['1:null There are 4 columns without names, so it cannot be told which is the count.']
    ],
    ['repeated-key.json', ['5:5 The count 0 is given twice: here and on line 3.']],
    ['cut-off.json', ['1:28 The text ends where a comma or "}" should stand.']],
    ['binary.csv', ['1:null The bytes are not text in utf-8: this looks like a binary file.']],
    [
      'workbook.csv',
      ['null:null This is a zip archive or an Excel or LibreOffice workbook, not a text file.']
    ],
    ['report.csv', ['null:null This is a PDF, not a text file.']]
  ])('%s', (name, expected) => {
    expect(problems(file(`bad/${name}`))).toEqual(expected);
  });

  it.each(readdirSync('fixtures/bad').filter((name) => name !== 'above-trials.csv'))(
    '%s is refused',
    (name) => {
      expect(readCounts(file(`bad/${name}`)).ok).toBe(false);
    }
  );

  it('above-trials.csv is refused once the trials are known', () => {
    expect(problems(file('bad/above-trials.csv'))).toEqual([]);
    expect(problems(file('bad/above-trials.csv'), { trials: 12 })).toEqual([
      '4:1 The count 13 is above the 12 trials given.'
    ]);
  });
});

describe('limits', () => {
  it('names the limit on bytes', () => {
    const result = readCounts(new Uint8Array(50 * 2 ** 20));
    expect(!result.ok && result.problems[0].message).toBe('The file has 50 MB; the limit is 20 MB.');
    expect(problems('0,1\n', { maxBytes: 3 })[0]).toContain('limit');
  });

  it('names the limit on rows', () => {
    expect(problems('0,1\n1,2\n', { maxRows: 2 })[0]).toContain('limit of 2');
  });

  it('names the limit on datasets, and the column that makes so many', () => {
    const rows = Array.from({ length: 1500 }, (_, index) => `A,${index},0,5`);
    const result = readCounts(`device,time,count,shots\n${rows.join('\n')}\n`);
    expect(!result.ok && result.problems[0].fix).toContain('"time"');
  });

  it('reads a million shots in a few seconds', () => {
    const text = `shot,batch,count\n${Array.from({ length: 1_000_000 }, (_, shot) => `${shot},${shot >> 10},${shot % 13}`).join('\n')}`;
    const start = process.cpuUsage();
    const result = readCounts(text, { maxBytes: 2 ** 26 });
    const { user } = process.cpuUsage(start);
    // Processor time, so that a busy machine does not matter. 2.5 s measured on a small one; 10 s
    // would mean that something grew with the square.
    expect(user / 1e6).toBeLessThan(10);
    expect(result.ok && result.reading.rows).toBe(1_000_000);
  });

  it('a web page is named', () => {
    expect(problems('<!DOCTYPE html><html></html>')[0]).toContain('web page');
  });
});

describe('encodings', () => {
  it('reads a Western spreadsheet’s bytes and says so', () => {
    const bytes = Uint8Array.from('Anzahl;Häufigkeit\n0;1\u00a0149\n', (character) =>
      character.charCodeAt(0)
    );
    const result = readCounts(bytes);
    expect(result.reading.encoding).toMatchObject({ value: 'windows-1252', from: 'guessed' });
    expect(result.ok && result.datasets[0].data).toMatchObject({ counts: [[0, 1149]] });
  });
});

describe('choices', () => {
  it('has a label for every value, and each value once', () => {
    for (const list of Object.values(choices)) {
      const values = list.map(({ value }) => value);
      expect(new Set<unknown>(values).size).toBe(values.length);
      expect(list.every(({ label }) => label.length > 0)).toBe(true);
    }
  });

  it('moves a role that only one column can have', () => {
    const once = withRole({}, 1, 'count');
    expect(withRole(once, 2, 'count').columns).toEqual([{ column: 2, role: 'count' }]);
    expect(withRole(once, 1, 'ignored').columns).toEqual([{ column: 1, role: 'ignored' }]);
    expect(withRole(withRole({}, 1, 'condition'), 2, 'condition').columns?.length).toBe(2);
  });
});
