import { describe, expect, it } from 'vitest';
import { locateCell } from '$lib/formats/table/locate-cell';

describe('locateCell', () => {
  it.each([
    ['0,12,x', 'comma', 0, 1],
    ['0,12,x', 'comma', 2, 6],
    ['0, 12', 'comma', 1, 4],
    ['"a,b",12', 'comma', 1, 7],
    ['\t12', 'tab', 1, 2],
    ['  0   12', 'spaces', 0, 3],
    ['  0   12', 'spaces', 1, 7],
    ['0;12', 'semicolon', 1, 3],
    ['0 12', 'none', 0, 1]
  ] as const)('in %j (%s) finds cell %d at %d', (line, separator, cell, expected) => {
    expect(locateCell(line, separator, cell)).toBe(expected);
  });

  it('says null where the line has no such cell', () => {
    expect(locateCell('0,12', 'comma', 2)).toBeNull();
  });
});
