import { describe, expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import { datasets, histogram, problems } from './support';

const three: [number, number][] = [
  [0, 12],
  [1, 1149],
  [2, 9]
];

describe('a table of counts', () => {
  it.each([
    ['count,frequency\n0,12\n1,1149\n2,9\n'],
    ['0,12\n1,1149\n2,9'],
    ['0;12\r\n1;1149\r\n2;9\r\n'],
    ['0\t12\r1\t1149\r2\t9'],
    ['  0 12\n  1 1149\n  2 9\n'],
    ['\ufeffcount, shots\n0, 12\n1, 1149\n2, 9\n'],
    ['# a remark, with "quotes\n\n0,12\n# another\n1,1149\n\n2,9\n'],
    ['Anzahl;Häufigkeit\n0;12\n1;1 149\n2;9\n'],
    ['nombre;effectif\n0;12\n1;1\u202f149\n2;9\n'],
    ['número;frecuencia\n0;12\n1;1149\n2;9\n'],
    ['shots,count\n12,0\n1149,1\n9,2\n'],
    ['value,count\n0,12\n1,1149\n2,9\n'],
    ['kinks,n\n0,12\n1,1149\n2,9\n'],
    ['number of kinks,number of shots\n0,12\n1,1149\n2,9\n'],
    ['count,expected,observed\n0,11.5,12\n1,1150.1,1149\n2,8.7,9\n'],
    ['count,shots,,\n0,12,,\n1,1149,,\n2,9,,\n'],
    ['"count","shots"\n"0","12"\n"1","1149"\n"2","9"\n'],
    ['sep=;\ncount;shots\n0;12\n1;1149\n2;9\n'],
    ['# count shots\n0 1.2e1\n1 1.149e3\n2 9e0\n'],
    ['0.0,12.0\n1.0,1149.0\n2.0,9.0\n'],
    ['2,9\n0,12\n1,1149\n'],
    ['count,shots\n0,12\n1,1149\n2,9\ntotal,1170\n'],
    ['"Count\nof kinks",shots\n0,12\n1,1149\n2,9\n']
  ])('is the same in the form %j', (text) => {
    expect(histogram(text)).toEqual({ kind: 'histogram', counts: three, lump: null });
  });

  it('takes the first of two columns without names for the count, and says so', () => {
    const { reading } = readCounts('5,0\n6,1\n');
    expect(reading.columns.map(({ role }) => [role.value, role.from])).toEqual([
      ['count', 'guessed'],
      ['frequency', 'guessed']
    ]);
    expect(reading.columns[0].role.why).toContain('first');
    const swapped = histogram('5,0\n6,1\n', { columns: [{ column: 2, role: 'count' }] });
    expect(swapped.counts).toEqual([
      [0, 5],
      [1, 6]
    ]);
  });

  it('keeps rows of no shots', () => {
    expect(histogram('0,3\n1,0\n2,1\n').counts).toEqual([
      [0, 3],
      [1, 0],
      [2, 1]
    ]);
  });

  it('may run on past the trials with rows that no shot had', () => {
    expect(histogram('0,3\n1,1\n2,0\n', { trials: 1 }).counts).toEqual([
      [0, 3],
      [1, 1]
    ]);
  });

  it.each(['10+,18', '≥10,18', '"10 or more",18', '10 or more,18', '>9,18'])(
    'reads the closing row %j',
    (row) => {
      const result = readCounts(`0,5\n9,1\n${row}\n`);
      expect(result.ok && result.datasets[0].data).toEqual({
        kind: 'histogram',
        counts: [
          [0, 5],
          [9, 1]
        ],
        lump: { from: 10, shots: 18 }
      });
      expect(result.reading.lump).toEqual({ from: 10, line: 3 });
    }
  );

  it('makes a dataset of each combination of conditions', () => {
    const text =
      'device,firmware,trials,count,shots\nA,1.0,12,0,5\nB,1.0,12,0,7\nA,1.0,12,1,6\nA,1.1,12,0,8\n';
    expect(datasets(text)).toEqual([
      {
        name: 'device A, firmware 1.0, trials 12',
        conditions: { device: 'A', firmware: '1.0', trials: '12' },
        data: {
          kind: 'histogram',
          counts: [
            [0, 5],
            [1, 6]
          ],
          lump: null
        },
        suggested: { trials: 12 }
      },
      expect.objectContaining({ name: 'device B, firmware 1.0, trials 12' }),
      expect.objectContaining({ name: 'device A, firmware 1.1, trials 12' })
    ]);
  });

  it('leaves a column out when told', () => {
    const text = 'device,count,shots\nA,0,5\nA,1,6\n';
    expect(datasets(text, { columns: [{ column: 'Device', role: 'ignored' }] })[0].conditions).toEqual({});
  });
});

describe('a table of counts is refused', () => {
  it('with all its problems, each in its place', () => {
    expect(problems('count,shots\n0,12\n1,-3\n2, 1.5\n3,abc\n-4,1\n6,NaN\n7\n0,5\n8,1e99\n')).toEqual([
      '3:3 "-3" is negative.',
      '4:4 "1.5" is not a whole number.',
      '5:3 "abc" is not a number.',
      '6:1 "-4" is negative.',
      '7:3 "NaN" is no number.',
      '8:2 This row has 1 cell where the others have 2.',
      '9:1 The count 0 is given twice: here and on line 2.',
      '10:3 "1e99" is above 2^53 (9 007 199 254 740 992): whole numbers are no longer exact there.'
    ]);
  });

  it('after twenty problems with the number of the others', () => {
    const result = readCounts(Array.from({ length: 33 }, (_, count) => `${count},-1`).join('\n'));
    expect(result).toMatchObject({ ok: false, more: 13 });
    expect(!result.ok && result.problems.length).toBe(20);
  });

  it.each([
    ['0,1.149\n1,3\n', {}, '1:3 "1.149" can be read two ways'],
    ['0;1,149\n1;3\n', {}, '1:3 "1,149" can be read two ways'],
    ['1,049\n3,265\n', {}, '1:null The commas can be read two ways'],
    ['1 049\n3 265\n', {}, '1:null The spaces can be read two ways'],
    ['0,12\n13,1\n', { trials: 12 }, '2:1 The count 13 is above the 12 trials given.'],
    ['0,12\n13+,1\n', { trials: 12 }, '2:1 The count 13 is above the 12 trials given.'],
    ['0,9007199254740992\n1,1\n', {}, '2:1 With this row the numbers of shots add up to more than 2^53'],
    ['0,0\n1,0\n', {}, '1:null There are no shots'],
    ['5+,3\n6,1\n', {}, '1:1 This row lumps all counts from 5, but 6 has a row of its own on line 2.'],
    ['5+,3\n6+,1\n', {}, '2:1 A second row lumps all larger counts; the first is on line 1.'],
    ['0-2,3\n2,1\n', {}, '1:1 This row lumps all counts up to 2, but 2 has a row of its own on line 2.'],
    ['≤2,3\n<2,1\n', {}, '2:1 A second row lumps all smaller counts; the first is on line 1.'],
    [
      '≤5,3\n≥4,1\n',
      {},
      '2:1 This row lumps all counts from 4, but the row on line 1 those up to 5: they overlap.'
    ],
    ['≤13,3\n', { trials: 12 }, '1:1 The count 13 is above the 12 trials'],
    ['0,3\n1-4,5\n', {}, '2:1 "1-4" is a range that does not begin at 0.'],
    ['0,3\n1,12 %\n', {}, '2:3 "12 %" is a percentage.'],
    ['0,3\n2-Jan,5\n', {}, '2:1 "2-Jan" looks like a date that a spreadsheet made out of a range.'],
    [
      'count,shots\n0,3\n1,2\ntotal,6\n',
      {},
      '4:7 This row says that there are 6 shots in total, but the others add up to 5.'
    ],
    ['A,1,3\nB,1,3\n', {}, '1:null There are 3 columns without names'],
    ['count,0,1,2\nshots,5,6,7\n', {}, '1:null The table runs across'],
    ['447,132,42,21', {}, '1:null One line of 4 numbers can be read two ways'],
    ['density,relative frequency\n0.1,0.5\n0.2,0.5\n', {}, '2:null No column is known to be the count'],
    ['count,relative frequency\n0,0.5\n1,0.5\n', {}, '2:null The column "relative frequency" holds shares'],
    ['device,kinks,foo\nA,0,5\nA,1,7\n', {}, '2:null It cannot be told whether column "foo"'],
    [
      'kinks,defects,shots\n0,1,5\n',
      {},
      '2:null It cannot be told which is the count: column "kinks" or column "defects".'
    ],
    [
      'count,shots\n0,1\n',
      { columns: [{ column: 'weight', role: 'count' as const }] },
      '2:null There is no column "weight"'
    ],
    ['device,count,shots\nA,0,5\n,1,6\n', {}, '3:1 The device of this row is empty.'],
    [
      '4\n5\n',
      { format: 'counts' as const },
      '1:null A table of counts needs a column with the numbers of shots'
    ],
    ['0,"12\n1,3\n', {}, '1:null A quotation mark is opened and not closed']
  ])('%j %j', (text, options, expected) => {
    const found = problems(text, options);
    expect(found[0]).toContain(expected);
    expect(found.length).toBe(1);
  });

  it('with each problem saying what to do', () => {
    const result = readCounts('0,-1\n1,x\n1,2,3\n');
    expect(!result.ok && result.problems.every(({ fix }) => fix.length > 10)).toBe(true);
  });
});

describe('a guess can be changed', () => {
  it('thousands and decimals', () => {
    expect(histogram('0;1.149\n1;3\n', { thousands: '.' }).counts[0]).toEqual([0, 1149]);
    expect(histogram('0;1.000\n1;3\n', { decimal: '.' }).counts[0]).toEqual([0, 1]);
    expect(histogram('0;1,149,265\n1;3,265\n').counts[1]).toEqual([1, 3265]);
  });

  it('separator and header', () => {
    expect(histogram('1,049\n3,265\n', { separator: 'comma' }).counts).toEqual([
      [1, 49],
      [3, 265]
    ]);
    expect(problems('a,b\n0,12\n', { header: false })[0]).toContain('1:1 "a" is not a number.');
  });

  it('and the reading says what was given', () => {
    const { reading } = readCounts('0,12\n', { separator: 'comma', header: false, format: 'counts' });
    expect([reading.separator?.from, reading.header?.from, reading.format?.from]).toEqual([
      'given',
      'given',
      'given'
    ]);
  });
});
