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
    expect(readClaimed('< 0.001')).toEqual({ value: 0.001, below: true, lastDigit: 0.001 });
    expect(readClaimed('≤ 1e-3')).toMatchObject({ value: 0.001, below: true });
  });

  it.each(['', ' ', 'x', '4.0.5', '1e999', 'NaN', 'Infinity', '4 ± 1', '> 3', '--4', 'e5', '1'.repeat(100)])(
    'refuses %j',
    (text) => expect(readClaimed(text)).toBeNull()
  );
});
