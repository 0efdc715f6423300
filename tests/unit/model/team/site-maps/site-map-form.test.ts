import { MAP_FIELDS, readMapForm, type TypedMap } from '$lib/model/team/site-maps/site-map-form';
import { describe, expect, it } from 'vitest';

const typed = (more: Partial<TypedMap>): TypedMap => ({
  ...(Object.fromEntries(MAP_FIELDS.map((field) => [field, ''])) as TypedMap),
  geometry: 'chain',
  seek: 'any',
  ...more
});

describe('the form of a map', () => {
  it('takes what was left empty as not stated, and a level with a comma', () => {
    expect(readMapForm(typed({ alpha: '0,01', device: ' Marram ', kinks: 'keep' }))).toEqual({
      ok: true,
      fields: {
        name: null,
        geometry: 'chain',
        seek: 'any',
        alpha: 0.01,
        device: 'Marram',
        firmware: null,
        group: null,
        keepsKinks: true
      }
    });
    expect(readMapForm(typed({ geometry: 'ring', seek: 'rise' }))).toMatchObject({
      fields: { geometry: 'ring', seek: 'rise', alpha: 0.05, keepsKinks: false }
    });
  });

  it.each([
    [{ alpha: '0' }, 'alpha'],
    [{ alpha: '1' }, 'alpha'],
    [{ alpha: 'small' }, 'alpha'],
    [{ geometry: 'square' }, 'geometry'],
    [{ seek: '' }, 'seek'],
    [{ firmware: '1.2' }, 'device'],
    [{ name: 'x'.repeat(181) }, 'name'],
    [{ group: 'x'.repeat(101) }, 'group']
  ])('marks %j', (wrong, field) => {
    const read = readMapForm(typed(wrong));
    expect(read.ok ? [] : Object.keys(read.problems)).toEqual([field]);
  });
});
