import { describe, expect, it } from 'vitest';
import { readLump } from '$lib/formats/number/read-lump';

const lump = (cell: string) => readLump(cell, { decimal: null, thousands: null });

describe('readLump', () => {
  it.each([
    '10+',
    '10 +',
    '≥10',
    '≥ 10',
    '>=10',
    '>= 10',
    '> 9',
    '10 or more',
    '10 and more',
    '10 And Over',
    '10 or  more',
    'at least 10',
    'more than 9',
    '10 und mehr',
    '10 oder mehr',
    'mehr als 9',
    '10 et plus',
    '10 ou plus',
    'plus de 9',
    '10 y más',
    '10 o más',
    '10 e più',
    '10 ou mais',
    '10 of meer',
    '10 и более',
    '10以上'
  ])('reads %j as ten and more', (cell) => {
    expect(lump(cell)).toBe(10);
  });

  it.each(['10', '', '10-12', '≤10', '<10', 'ten or more', '10.5+', '+10', '10 or less', 'more', '-3+'])(
    'finds no lump in %j',
    (cell) => {
      expect(lump(cell)).toBeNull();
    }
  );
});
