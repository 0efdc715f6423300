import { readAt, withAt, withoutAt } from '$lib/page/at';
import { LONGEST, readAddress, writeAddress } from '$lib/page/address';
import { readSettings } from '$lib/page/read-settings';
import { defaultOptions } from '$lib/stats/default-options';
import type { CountData, DiagnoseOptions, Geometry, Unit } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const histogram = fc
  .tuple(
    fc.uniqueArray(fc.tuple(fc.nat(200), fc.integer({ min: 1, max: 2 ** 40 })), {
      minLength: 1,
      maxLength: 30,
      selector: ([n]) => n
    }),
    fc.option(fc.integer({ min: 1, max: 999 }))
  )
  .map(([rows, lump]): CountData => {
    const counts = [...rows].sort((a, b) => a[0] - b[0]);
    return { kind: 'histogram', counts, lump: lump === null ? null : { from: 201, shots: lump } };
  });
const shots = fc
  .array(fc.tuple(fc.nat(3), fc.constantFrom('a', 'b c', 'x*2', 'ä,&=#')), { minLength: 1, maxLength: 60 })
  .chain((rows) =>
    fc.boolean().map((named): CountData => ({
      kind: 'shots',
      shots: rows.map(([n]) => n),
      batches: named ? rows.map(([, b]) => b) : null
    }))
  );
const options: fc.Arbitrary<DiagnoseOptions> = fc.record({
  trials: fc.option(fc.integer({ min: 201, max: 1e6 })),
  unit: fc.constantFrom<Unit>('defect', 'pair'),
  geometry: fc.constantFrom<Geometry>('sites', 'open-bonds', 'ring-bonds'),
  alpha: fc.constantFrom(0.01, 0.05, 1e-6),
  tolerance: fc.constantFrom(0.1, 0.25),
  resamples: fc.integer({ min: 19, max: 1e6 }),
  seed: fc.nat(2 ** 32 - 1),
  misread: fc.option(fc.constantFrom(0.01, 0.002)),
  supplied: fc.option(fc.array(fc.constantFrom(0.1, 0.25, 1e-7), { minLength: 1, maxLength: 9 }))
});

describe('the address', () => {
  it('gives back the same counts, options and name', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.oneof(histogram, shots),
        options,
        fc.option(fc.string({ minLength: 1 })),
        async (data, chosen, name) => {
          const text = writeAddress(data, chosen, name);
          if (text === null) return;
          expect(text.length).toBeLessThanOrEqual(LONGEST);
          expect(decodeURI(new URL(`http://x/#${text}`).hash)).toBe(`#${decodeURI(text)}`);
          const address = readAddress(`#${text}`);
          expect(address?.data).toEqual(data);
          expect(address?.name ?? null).toBe(name);
          const settings = address && (await readSettings(address.settings));
          expect(settings).toEqual({ ok: true, options: chosen });
        }
      ),
      { numRuns: 200, seed: 7 }
    );
  });
  it('is readable', () => {
    const data: CountData = {
      kind: 'histogram',
      counts: [
        [0, 185],
        [1, 1149]
      ],
      lump: { from: 10, shots: 18 }
    };
    expect(writeAddress(data, { ...defaultOptions, trials: 12 }, null)).toBe(
      'counts=0:185,1:1149,10+:18&trials=12'
    );
    expect(writeAddress({ kind: 'shots', shots: [3, 3, 3, 1], batches: null }, defaultOptions, 'a b')).toBe(
      'shots=3*3,1&name=a%20b'
    );
  });
  it('is not written when it would be too long', () => {
    const counts = Array.from({ length: 500 }, (_, n): [number, number] => [n, 1000 + n]);
    expect(writeAddress({ kind: 'histogram', counts, lump: null }, defaultOptions, null)).toBeNull();
  });
  it.each([
    '',
    '#',
    '#tails',
    '#counts=',
    '#counts=1',
    '#counts=1:2,x:3',
    '#counts=1:2&unit=other',
    '#counts=5+:1,6:2',
    '#shots=1,2&batches=a',
    '#shots=2*999999',
    '#name=%E0%A4%A',
    '#counts=1:2&name=%E0%A4%A'
  ])('refuses %s', (fragment) => expect(readAddress(fragment)).toBeNull());
  it('carries where to open', () => {
    expect(withAt('counts=1:2', 'rate')).toBe('counts=1:2&at=rate');
    expect(withAt(null, 'rate')).toBe('at=rate');
    expect(readAt('#counts=1:2&at=counts-and-law')).toBe('counts-and-law');
    expect(readAt('#counts=1:2')).toBeNull();
    expect(withoutAt('#counts=1:2&at=rate')).toBe('counts=1:2');
    expect(withoutAt('#at=rate')).toBe('');
  });
});
