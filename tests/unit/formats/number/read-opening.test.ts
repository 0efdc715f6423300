import { describe, expect, it } from 'vitest';
import { readLump } from '$lib/formats/number/read-lump';
import { readOpening } from '$lib/formats/number/read-opening';

const style = { decimal: null, thousands: null };

describe('readOpening', () => {
  it.each([
    '≤2',
    '≤ 2',
    '<=2',
    '=< 2',
    '< 3',
    '0-2',
    '0–2',
    '0 - 2',
    '0 to 2',
    '0..2',
    '0 bis 2',
    '0 à 2',
    '2 or fewer',
    '2 or less',
    '2 And Fewer',
    'at most 2',
    'up to 2',
    'fewer than 3',
    'less than 3',
    'max. 2',
    'höchstens 2',
    'bis 2',
    '2 oder weniger',
    'weniger als 3',
    '2 ou moins',
    'au plus 2',
    'moins de 3',
    '2 o menos',
    'como máximo 2',
    '2 o meno',
    '2 of minder',
    '2 и менее',
    '2以下'
  ])('reads %j as two and fewer, and as no closing row', (cell) => {
    expect(readOpening(cell, style)).toBe(2);
    expect(readLump(cell, style)).toBeNull();
  });

  it.each(['2', '', '1-2', '≥2', '2+', '<0', '10 or more', 'two or fewer', '≤2.5', '0-', '0--2', '≤-1'])(
    'finds no opening row in %j',
    (cell) => expect(readOpening(cell, style)).toBeNull()
  );
});
