import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readTyped, writeTyped } from '$lib/page/typed-address';

const fresh = { mean: '', alpha: '0.05', counts: '' };

describe('the address of typed fields', () => {
  it('brings back whatever was typed', () => {
    fc.assert(
      fc.property(
        fc.string({ maxLength: 100 }),
        fc.string({ maxLength: 100, unit: 'grapheme' }),
        (mean, counts) => {
          const fields = { ...fresh, mean, counts };
          const address = writeTyped(fields, fresh);
          if (address === null) return;
          expect(readTyped(`#${address}`, fresh)).toEqual({ fields, unknown: [] });
        }
      ),
      { seed: 4 }
    );
  });

  it('leaves out what is as on a fresh page, and is nothing for one', () => {
    expect(writeTyped(fresh, fresh)).toBe('');
    expect(writeTyped({ ...fresh, mean: '1,5' }, fresh)).toBe('mean=1%2C5');
  });

  it('names the parts that it cannot use', () => {
    expect(readTyped('#mean=3&colour=red&alpha=%E0%A4%A&toString=1', fresh)).toEqual({
      fields: { ...fresh, mean: '3' },
      unknown: ['colour=red', 'alpha=%E0%A4%A', 'toString=1']
    });
  });

  it('is none when it would be too long', () => {
    expect(writeTyped({ ...fresh, counts: '1\n'.repeat(1000) }, fresh)).toBeNull();
  });
});
