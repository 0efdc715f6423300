import { describe, expect, it } from 'vitest';
import { histogram, problems } from './support';

const told = { format: 'positions' } as const;
const expected = [
  [0, 447],
  [1, 132],
  [2, 0],
  [3, 21]
];

describe('numbers of shots by position', () => {
  it.each([
    '447\n132\n0\n21\n',
    'frequency\n447\n132\n0\n21',
    'h\n447\n132\n0\n21',
    '447, 132, 0, 21',
    '447 132 0 21\n',
    'count,shots\n0,447\n1,132\n2,0\n3,21\n'
  ])('are read from %j when told', (text) => {
    expect(histogram(text, told).counts).toEqual(expected);
  });

  it('are refused like any other', () => {
    expect(problems('447\n-1\n1.5\n', told)).toEqual([
      '2:1 "-1" is negative.',
      '3:1 "1.5" is not a whole number.'
    ]);
    expect(problems('447\n1\n2\n', { ...told, trials: 1 })).toEqual([
      '3:1 The count 2 is above the 1 trial given.'
    ]);
    expect(problems('0\n0\n', told)[0]).toContain('no shots');
    expect(problems('1,2\n3,4\n', told)[0]).toContain('2 columns');
  });
});
