import { describe, expect, it } from 'vitest';
import { readProbabilities } from '$lib/formats/read-probabilities';

const read = (text: string, options = {}) => {
  const result = readProbabilities(text, options);
  return result.ok
    ? result.probabilities
    : result.problems.map(({ line, column, message }) => `${line}:${column} ${message}`);
};

describe('readProbabilities', () => {
  it.each([
    '0.1\n0.2\n0.25\n',
    '# a remark\np_k\n0.1\n\n0.2\r\n0.25',
    '0.1, 0.2, 0.25',
    '0.1,0.2,0.25',
    '.1 2e-1 0.25',
    '0,1;0,2;0,25',
    '0,1\n0,2\n0,25\n',
    '[0.1, 0.2, 0.25]',
    '{"probabilities": [0.1, 0.2, 0.25]}',
    '{"levels": [{"p": 0.1, "trials": 1}, {"p": 0.2, "trials": 1}, {"p": 0.25, "trials": 1}]}'
  ])('reads %j', (text) => {
    expect(read(text)).toEqual([0.1, 0.2, 0.25]);
  });

  it('keeps order, repeats, 0 and 1, and unfolds levels', () => {
    expect(read('1 0 0.5 0.5')).toEqual([1, 0, 0.5, 0.5]);
    expect(read('{"fit": {"levels": [{"p": 0.5, "trials": 3}]}}')).toEqual([0.5, 0.5, 0.5]);
  });

  it.each([
    [
      '0.1\n1.2\n-0.1\n20%\nx\n',
      [
        '2:1 "1.2" is above 1.',
        '3:1 "-0.1" is no probability.',
        '4:1 "20%" is a percentage.',
        '5:1 "x" is no probability.'
      ]
    ],
    ['', ['1:null There are no probabilities.']],
    ['# only\n', ['1:null There are no probabilities.']],
    ['0,1\n0,1\n', ['1:1 The commas can be read two ways: between probabilities, or as decimal marks.']],
    ['[0.1, 2]', ['1:7 the number 2 stands where a probability from 0 to 1 should.']],
    ['{"p": 1}', ['1:1 There is no list of probabilities.']],
    ['[0.1', ['1:5 The text ends where a comma or "]" should stand.']],
    [
      '{"levels": [{"p": 0.5, "trials": 1e9}]}',
      ['1:34 the number 1e9 stands where a number "trials" should.']
    ],
    ['{"levels": [{"p": 0.5, "trials": 1.5}]}', ['1:13 1.5 trials are not a whole number.']]
  ])('refuses %j', (text, expected) => {
    expect(read(text)).toEqual(expected);
  });

  it('takes the decimal mark from the person', () => {
    expect(read('0,1\n0,1\n', { decimal: ',' })).toEqual([0.1, 0.1]);
    expect(read('0,1\n0,1\n', { decimal: '.' })).toEqual([0, 1, 0, 1]);
  });

  it('names its limits', () => {
    expect(read('0.1 '.repeat(10), { maxBytes: 20 })[0]).toContain('limit');
    expect(read('0 '.repeat(1_000_001))[0]).toContain('1000000');
  });
});
