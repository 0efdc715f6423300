import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import { readWholeNumber, type NumberStyle } from '$lib/formats/number/read-whole-number';

const open: NumberStyle = { decimal: null, thousands: null };
const value = (cell: string, style = open) => {
  const read = readWholeNumber(cell, style);
  return read.ok ? read.value : read.bad;
};

describe('readWholeNumber', () => {
  it.each([
    ['0', 0],
    ['007', 7],
    [' 12 ', 12],
    ['+12', 12],
    ['-0', 0],
    ['1e3', 1000],
    ['1E+3', 1000],
    ['1.5e1', 15],
    ['10e-1', 1],
    ['1.850000000000000000e+02', 185],
    ['1 000', 1000],
    ['12 345 678', 12345678],
    ['1\u00a0149', 1149],
    ['1\u2009149', 1149],
    ['1\u202f149', 1149],
    ["1'149", 1149],
    ['1’149', 1149],
    ['1,149,265', 1149265],
    ['1.149.265', 1149265],
    ['1,149.0', 1149],
    ['1.149,00', 1149],
    ['12.0', 12],
    ['12,0', 12],
    ['12.', 12],
    ['0.000', 0],
    ['9007199254740992', 2 ** 53]
  ])('reads %j as %d', (cell, expected) => {
    expect(value(cell)).toBe(expected);
  });

  it.each([
    ['', 'missing'],
    ['NaN', 'missing'],
    ['N/A', 'missing'],
    ['#N/A', 'missing'],
    ['-', 'missing'],
    ['inf', 'infinite'],
    ['-Infinity', 'infinite'],
    ['∞', 'infinite'],
    ['-3', 'negative'],
    ['−3', 'negative'],
    ['-1.5', 'negative'],
    ['1.5', 'fraction'],
    ['12,5', 'fraction'],
    ['0.25', 'fraction'],
    ['1e-1', 'fraction'],
    ['0.149', 'fraction'],
    ['1.149', 'ambiguous'],
    ['1,000', 'ambiguous'],
    ['12.000', 'ambiguous'],
    ['12 %', 'share'],
    ['9007199254740993', 'too-large'],
    ['1e16', 'too-large'],
    ['1e999999999999', 'too-large'],
    ['1'.repeat(1000), 'too-large'],
    ['abc', 'not-a-number'],
    ['0x10', 'not-a-number'],
    ['1 00', 'not-a-number'],
    ['1 0000', 'not-a-number'],
    ['1,23,456', 'not-a-number'],
    ['1e', 'not-a-number'],
    ['.', 'missing'],
    ['٣', 'not-a-number'],
    ['5-', 'not-a-number'],
    ['12 # note', 'not-a-number']
  ])('refuses %j: %s', (cell, expected) => {
    expect(value(cell)).toBe(expected);
  });

  it('settles a single mark by the style of the file', () => {
    expect(value('1,149', { decimal: null, thousands: ',' })).toBe(1149);
    expect(value('1,149', { decimal: ',', thousands: null })).toBe('fraction');
    expect(value('1,000', { decimal: ',', thousands: null })).toBe(1);
    expect(value('1.000', { decimal: ',', thousands: null })).toBe(1000);
    expect(value('1.000', { decimal: null, thousands: 'none' })).toBe(1);
    expect(value('12,0', { decimal: '.', thousands: null })).toBe('not-a-number');
    expect(value('12,5', { decimal: null, thousands: ',' })).toBe('not-a-number');
  });

  it('reads back every whole number up to 2^53, plain, spaced and in exponents', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2 ** 53 - 1 }), (number) => {
        expect(value(String(number))).toBe(number);
        expect(value(number.toLocaleString('en').replaceAll(',', '\u2009'))).toBe(number);
        expect(value(number.toExponential())).toBe(number);
      })
    );
  });
});
