import { describe, expect, it } from 'vitest';
import { decideHeader, namesInComment } from '$lib/formats/table/decide-header';

describe('decideHeader', () => {
  it.each([
    [['count', 'shots'], true],
    [['', 'shots'], true],
    [['foo', 'bar'], true],
    [['0', '12'], false],
    [['A', '12'], false],
    [['10+', '12'], false],
    [['NaN', 'NaN'], false],
    [['-3', '1.5'], false]
  ])('of %j is %s', (row, expected) => {
    expect(decideHeader(row).value).toBe(expected);
  });

  it('is what the person says', () => {
    expect(decideHeader(['0', '12'], true)).toMatchObject({ value: true, from: 'given' });
  });
});

describe('namesInComment', () => {
  it.each([
    ['count shots', 2, ['count', 'shots']],
    ['count, number of shots', 2, null],
    ['kinks;quench time', 2, ['kinks', 'quench time']],
    ['500 shots, 12 sites', 2, null],
    ['some remark', 2, null],
    ['counts', 1, null],
    ['count shots', 3, null],
    [null, 2, null]
  ])('of %j for %d columns are %j', (comment, width, expected) => {
    expect(namesInComment(comment, width)).toEqual(expected);
  });
});
