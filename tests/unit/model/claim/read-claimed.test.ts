import { readClaimed } from '$lib/model/claim/read-claimed';
import { describe, expect, it } from 'vitest';

describe('readClaimed', () => {
  it.each([
    ['4.05', 4.05, 0.01],
    ['4,05', 4.05, 0.01],
    [' 4.050 ', 4.05, 0.001],
    ['4', 4, 1],
    ['1 234.5', 1234.5, 0.1],
    ['−0.30', -0.3, 0.01],
    ['+.5', 0.5, 0.1],
    ['1.2e-4', 1.2e-4, 1e-5],
    ['1.2E+3', 1200, 100],
    ['2.5 × 10⁻⁴', 2.5e-4, 1e-5],
    ['2.5x10^-4', 2.5e-4, 1e-5],
    ['2.5 \u00b7 10^{-4}', 2.5e-4, 1e-5]
  ])('%s', (text, value, lastDigit) => {
    const found = readClaimed(text);
    expect(found?.value).toBeCloseTo(value, 12);
    expect(found?.below).toBe(false);
    expect(found!.lastDigit / lastDigit).toBeCloseTo(1, 12);
  });

  it('reads what is less than', () => {
    expect(readClaimed('< 0.001')).toMatchObject({ value: 0.001, below: true, lastDigit: 0.001 });
    expect(readClaimed('≤ 1e-3')).toMatchObject({ value: 0.001, below: true });
  });

  it.each([
    // GUM, JCGM 100:2008, 7.2.2: "m_S = 100,021 47(35) g" stands for 100,021 47 g with u = 0,000 35 g.
    ['100,021 47(35)', 100.02147, 0.00035],
    // The other form there: "100,021 47(0,000 35)".
    ['100,021 47(0,000 35)', 100.02147, 0.00035],
    ['8.45(12)', 8.45, 0.12],
    ['8(2)', 8, 2],
    // CODATA 2018: Newtonian constant, 6.674 30(15) × 10⁻¹¹.
    ['6.674 30(15) × 10⁻¹¹', 6.6743e-11, 1.5e-15]
  ])('%s has its uncertainty in brackets', (text, value, uncertainty) => {
    const found = readClaimed(text);
    expect(found!.value / value).toBeCloseTo(1, 12);
    expect(found!.bracketed! / uncertainty).toBeCloseTo(1, 12);
  });

  it('says how a comma was read that may part thousands', () => {
    expect(readClaimed('1,234')).toMatchObject({ value: 1.234, readAs: '1.234' });
    expect(readClaimed('−12,345')).toMatchObject({ value: -12.345, readAs: '-12.345' });
    for (const clear of ['4,05', '0,123', '1.234', '1,2345', '1234,567'])
      expect(readClaimed(clear)?.readAs).toBeNull();
    expect(readClaimed('4.05')?.bracketed).toBeNull();
  });

  it.each([
    '',
    ' ',
    'x',
    '4.0.5',
    '1e999',
    'NaN',
    'Infinity',
    '4 ± 1',
    '> 3',
    '--4',
    'e5',
    '8.45()',
    '< 0.1(2)',
    '1,234,567',
    '1'.repeat(100)
  ])('refuses %j', (text) => expect(readClaimed(text)).toBeNull());
});
