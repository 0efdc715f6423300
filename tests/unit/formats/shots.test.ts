import { describe, expect, it } from 'vitest';
import { readCounts } from '$lib/formats/read-counts';
import { datasets, problems, shotList } from './support';

describe('a shot list', () => {
  it.each([
    ['3\n0\n4\n'],
    ['count\n3\n0\n4'],
    ['# a remark\n3\r\n\r\n0\r\n4\r\n'],
    ['"3"\n"0"\n"4"\n'],
    ['kinks\n3\n0\n4\n']
  ])('keeps the order of %j', (text) => {
    expect(shotList(text)).toEqual({ shots: [3, 0, 4], batches: null });
  });

  it('says that one column could be numbers of shots', () => {
    const result = readCounts('3\n0\n4\n');
    expect(result.reading.format).toMatchObject({ value: 'shots', from: 'guessed' });
    expect(result.ok && result.notes[0]).toContain('positions');
    expect(readCounts('3\n0\n', { format: 'shots' })).toMatchObject({ ok: true, notes: [] });
  });

  it('takes shot number and batch by name', () => {
    const text = 'shot,batch,count\n1,a,3\n2,a,0\n3,b,4\n';
    expect(shotList(text)).toEqual({ shots: [3, 0, 4], batches: ['a', 'a', 'b'] });
    expect(readCounts(text).reading.columns.map(({ role }) => role.value)).toEqual([
      'shot',
      'batch',
      'count'
    ]);
  });

  it('takes two columns for shot and count when told that it is a shot list', () => {
    expect(shotList('1,3\n2,0\n', { format: 'shots' }).shots).toEqual([3, 0]);
    expect(shotList('a,3\na,0\n', { format: 'shots' })).toEqual({ shots: [3, 0], batches: ['a', 'a'] });
  });

  it('puts shots in the order of their numbers, and says so', () => {
    const result = readCounts('shot,count\n3,30\n1,10\n2,20\n');
    expect(shotList('shot,count\n3,30\n1,10\n2,20\n').shots).toEqual([10, 20, 30]);
    expect(result.ok && result.notes.join()).toContain('order of the shot numbers');
  });

  it('numbers that start again in each batch keep the batches apart', () => {
    const text = 'batch,shot,count\nb,2,4\nb,1,3\na,1,5\na,2,6\n';
    expect(shotList(text)).toEqual({ shots: [3, 4, 5, 6], batches: ['b', 'b', 'a', 'a'] });
  });

  it('numbers that are time stamps leave the order alone', () => {
    expect(shotList('shot,count\n12:05,1\n12:04,2\n').shots).toEqual([1, 2]);
  });

  it('a run that repeats is a batch, one that does not is a shot', () => {
    expect(shotList('run,count\n1,3\n1,4\n2,5\n').batches).toEqual(['1', '1', '2']);
    expect(shotList('run,count\n1,3\n2,4\n3,5\n').batches).toBeNull();
  });

  it('is divided by conditions', () => {
    const found = datasets('device,count\nA,3\nB,4\nA,5\n');
    expect(found.map(({ name, data }) => [name, data.kind === 'shots' && Array.from(data.shots)])).toEqual([
      ['device A', [3, 5]],
      ['device B', [4]]
    ]);
  });

  it('one line of counts when told', () => {
    expect(shotList('3, 0, 4, 4', { format: 'shots' }).shots).toEqual([3, 0, 4, 4]);
    expect(shotList('3 0 4 4\n', { format: 'shots' }).shots).toEqual([3, 0, 4, 4]);
  });
});

describe('a shot list is refused', () => {
  it.each([
    ['3\n-1\n2.5\n', {}, ['2:1 "-1" is negative.', '3:1 "2.5" is not a whole number.']],
    ['3\n13\n', { trials: 12 }, ['2:1 The count 13 is above the 12 trials given.']],
    ['3\n4294967296\n', {}, ['2:1 The count 4294967296 is too large.']],
    ['shot,count\n1,3\n2,4\n1,5\n', {}, ['4:1 Shot 1 is given twice: here and on line 2.']],
    ['batch,count\na,3\n,4\n', {}, ['3:1 The batch of this row is empty.']],
    [
      '3, 0, x, 4',
      { format: 'shots' as const },
      ['1:null There are 4 columns without names, so it cannot be told which is the count.']
    ],
    ['3, 0, -2, 4', { format: 'shots' as const }, ['1:7 "-2" is negative.']]
  ])('%j %j', (text, options, expected) => {
    expect(problems(text, options)).toEqual(expected);
  });

  it('when one column is called frequency: of which counts?', () => {
    expect(problems('frequency\n3\n4\n')[0]).toContain('not for which counts');
  });
});
