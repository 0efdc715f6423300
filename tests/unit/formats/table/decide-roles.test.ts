import { describe, expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import type { ReadOptions } from '$lib/formats/types';

/** Roles by column, or the first problem. */
function roles(text: string, options: ReadOptions = {}): string {
  const result = readCounts(text, options);
  return result.ok
    ? result.reading.columns.map(({ role }) => role.value).join(' ')
    : result.problems[0].message;
}

describe('columns with names', () => {
  it.each([
    ['count,shots\n0,5\n1,6\n', 'count frequency'],
    ['shots,count\n5,0\n6,1\n', 'frequency count'],
    ['shot,count\n1,0\n2,0\n', 'shot count'],
    ['n,count\n0,5\n1,6\n', 'count frequency'],
    ['Anzahl,Wert\n5,0\n6,1\n', 'frequency count'],
    ['kinks,n\n0,5\n1,6\n', 'count frequency'],
    ['kinks,number\n0,5\n1,6\n', 'count frequency'],
    ['foo,bar\n0,5\n1,6\n', 'count frequency'],
    ['foo,count\n0,5\n1,6\n', 'count frequency'],
    ['foo,shots\n0,5\n1,6\n', 'count frequency'],
    ['squares,cells\n5,0\n6,1\n', 'frequency count'],
    ['index,shots\n0,5\n1,6\n', 'count frequency'],
    ['lab,foo,shots\nA,0,5\nA,1,6\n', 'condition count frequency'],
    ['site,count\nA,0\nA,0\nB,1\n', 'condition count'],
    ['device,tau,count\nA,1,0\nA,1,0\nA,2,1\n', 'condition condition count'],
    ['time,count\n0.1,3\n0.2,4\n0.3,3\n', 'shot count'],
    ['batch,count,shots\na,0,5\nb,0,6\n', 'condition count frequency'],
    ['session,batch,count\n1,a,0\n1,b,0\n', 'batch batch count'],
    ['shot,device,kinks,note\n1,A,0,ok\n2,A,0,\n', 'shot condition count ignored'],
    ['count,expected,observed\n0,1.5,5\n1,2.5,6\n', 'count ignored frequency'],
    ['trials,count,shots\n12,0,5\n12,1,6\n', 'condition count frequency']
  ])('%j are %s', (text, expected) => {
    expect(roles(text)).toBe(expected);
  });

  it.each([
    ['N,n,shots\n12,0,5\n12,1,6\n', 'It cannot be told which is the count: column "N" or column "n".'],
    [
      'N,n,count\n12,0,5\n12,1,6\n',
      'It cannot be told which is the count: column "N" or column "n" or column "count".'
    ],
    [
      'kinks,n,number\n0,5,1\n1,6,2\n',
      'It cannot be told which is the count: column "kinks" or column "n" or column "number".'
    ],
    [
      'observed,shots,count\n1,5,0\n',
      'Both column "observed" and column "shots" may be the number of shots.'
    ],
    [
      'device,kinks,foo\nA,0,5\nA,1,6\n',
      'It cannot be told whether column "foo" is the number of shots or a condition.'
    ],
    [
      'kinks,foo,bar\n0,5,1\n1,6,2\n',
      'It cannot be told whether column "foo" is the number of shots or a condition.'
    ],
    [
      'count,trials\n0,5\n1,6\n',
      'It cannot be told whether column "trials" is the number of shots or a condition.'
    ],
    ['a,b,c\n0,5,1\n1,6,2\n', 'No column is known to be the count (a, b, c).'],
    [
      'count,probability\n0,0.5\n1,0.5\n',
      'The column "probability" holds shares, and no column the numbers of shots.'
    ],
    [
      'A title\ncount\n3\n',
      'This line holds words only, like the one above it, which was taken for the names of the columns.'
    ],
    ['count,shots\n(1),(1)\nabc,def\n', '"(1)" is not a number.']
  ])('%j are refused: %s', (text, expected) => {
    expect(roles(text)).toBe(expected);
  });

  it('what the person says of one column leaves the others to be found', () => {
    expect(roles('N,n,shots\n12,0,5\n12,1,6\n', { columns: [{ column: 'n', role: 'count' }] })).toBe(
      'condition count frequency'
    );
    expect(
      roles('a,b,c\n0,5,1\n1,6,2\n', {
        columns: [
          { column: 1, role: 'count' },
          { column: 'c', role: 'ignored' }
        ]
      })
    ).toBe('It cannot be told whether column "b" is the number of shots or a condition.');
    expect(
      roles('a,b,c\n0,5,1\n1,6,2\n', {
        columns: [
          { column: 1, role: 'count' },
          { column: 2, role: 'frequency' },
          { column: 3, role: 'ignored' }
        ]
      })
    ).toBe('count frequency ignored');
    expect(
      roles('count,shots\n0,5\n', {
        columns: [
          { column: 1, role: 'count' },
          { column: 2, role: 'count' }
        ]
      })
    ).toBe('Two columns are said to be the count.');
  });
});

describe('columns without names', () => {
  it.each([
    ['3\n4\n', {}, 'count'],
    ['0,5\n1,6\n', {}, 'count frequency'],
    [
      'A,0,5\nA,1,6\n',
      {
        columns: [
          { column: 2, role: 'count' as const },
          { column: 3, role: 'frequency' as const }
        ]
      },
      'condition count frequency'
    ],
    ['1,3\n2,4\n', { format: 'shots' as const }, 'shot count'],
    [
      '1,a,3\n2,a,4\n',
      { format: 'shots' as const, columns: [{ column: 3, role: 'count' as const }] },
      'shot batch count'
    ]
  ])('%j with %j are %s', (text, options, expected) => {
    expect(roles(text, options)).toBe(expected);
  });

  it('a numbered first column is read as the rule says, with a remark', () => {
    const list = Array.from({ length: 40 }, (_, shot) => `${shot + 1},${shot % 7}`).join('\n');
    const result = readCounts(list);
    expect(result.ok && result.notes[0]).toContain('numbers the shots');
    const histogram = Array.from({ length: 40 }, (_, count) => `${count},${count * 9}`).join('\n');
    const plain = readCounts(histogram);
    expect(plain.ok && plain.notes).toEqual([]);
  });
});
