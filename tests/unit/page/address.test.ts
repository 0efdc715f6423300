import { readAt, withAt, withoutAt } from '$lib/page/at';
import { LONGEST, MOST, writeAddress } from '$lib/page/address';
import { readAddress } from '$lib/page/read-address';
import { addressWords } from '$lib/page/address-words';
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
const plain: fc.Arbitrary<DiagnoseOptions> = fc.record({
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
// An uncertainty is of a rate that was stated.
const options = fc
  .tuple(plain, fc.option(fc.constantFrom(0.001, 0.0002)))
  .map(([chosen, unsure]) =>
    chosen.misread === null || unsure === null ? chosen : { ...chosen, misreadUncertainty: unsure }
  );

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
          const read = readAddress(`#${text}`);
          if (!read.ok) throw new Error(read.problem);
          expect(read.address.whole).toBe(true);
          expect(read.address.data).toEqual(data);
          expect(read.address.name).toBe(name);
          expect(await readSettings(read.address.settings)).toEqual({ ok: true, options: chosen });
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
      'counts=0:185,1:1149,10+:18&trials=12&sum=1352'
    );
    expect(writeAddress({ kind: 'shots', shots: [3, 3, 3, 1], batches: null }, defaultOptions, 'a b')).toBe(
      'shots=3*3,1&name=a%20b&sum=4'
    );
  });
  it('is not written when it would be too long', () => {
    const counts = Array.from({ length: 500 }, (_, n): [number, number] => [n, 1000 + n]);
    expect(writeAddress({ kind: 'histogram', counts, lump: null }, defaultOptions, null)).toBeNull();
  });
  it.each([
    ['', 'no counts|not understood'],
    ['#', 'no counts|not understood'],
    ['#tails', 'tails'],
    ['#garbage', 'garbage'],
    ['#counts=garbage', 'counts=garbage'],
    ['#counts=', 'counts='],
    ['#counts=1', 'counts=1'],
    ['#counts=0:-1', 'counts=0:-1'],
    ['#counts=1:2,x:3', 'counts=x:3'],
    ['#counts=1:99999999999999999999', 'counts=1:9'],
    ['#counts=1:2&unit=other', 'unit=other'],
    ['#counts=1:2&geometry=cube', 'geometry=cube'],
    ['#counts=1:2&trails=12', 'trails=12'],
    ['#counts=1:2&counts=3:4', 'counts=3:4'],
    ['#counts=1:2&shots=3', 'both'],
    ['#alpha=7', 'no counts'],
    ['#counts=5+:1,6:2', 'counts=6:2'],
    ['#shots=1,2&batches=a', 'batches'],
    ['#shots=2*999999', 'shots'],
    ['#%E0%A4', '%E0%A4'],
    ['#counts=1:2&name=%E0%A4%A', 'name=%E0%A4%A'],
    [`#counts=1:2&name=${'a'.repeat(4000)}`, '4000 characters']
  ])('refuses %s and names the part', (fragment, part) => {
    const read = readAddress(fragment);
    expect(read.ok ? 'read' : read.problem).toMatch(
      new RegExp(`^This address could not be read: .*(${part})`)
    );
  });
  it('refuses more entries than are ever written, without making them', () => {
    const heap = (times: number) => Array.from({ length: times }, () => '1*99999').join(',');
    for (const fragment of [
      `shots=${heap(400)}`,
      `shots=1&batches=${heap(2)}`,
      `counts=0:1&law=${heap(2)}`
    ]) {
      const began = performance.now();
      const read = readAddress(fragment);
      expect(read.ok ? 'read' : read.problem).toMatch(new RegExp(`more than ${MOST} entries`));
      expect(performance.now() - began).toBeLessThan(500);
    }
  });
  it('shows at every place where it may be cut that it was cut', () => {
    const counts: [number, number][] = [
      [0, 185],
      [1, 1149],
      [2, 3265]
    ];
    const text = writeAddress(
      { kind: 'histogram', counts, lump: null },
      { ...defaultOptions, trials: 12 },
      'a'
    );
    if (text === null) throw new Error('no address');
    for (let end = 0; end < text.length; end++) {
      const read = readAddress(text.slice(0, end));
      expect(read.ok && read.address.whole).toBe(false);
    }
    const changed = readAddress(text.replace('1149', '1148'));
    expect(changed.ok ? 'read' : changed.problem).toMatch(/^This address was cut off or changed/);
  });
  it('says which part cannot hold, and what is left to the person', () => {
    expect(addressWords(null, { alpha: 'x' }, '', true)).toContain('“alpha”');
    expect(addressWords(null, { trials: undefined }, 'A count is above N.', true)).toMatch(/read: A count/);
    expect(addressWords(null, {}, '', true)).toBe('');
    expect(addressWords(null, {}, '', false)).toMatch(/by hand or cut off/);
  });
  it('carries where to open', () => {
    expect(withAt('counts=1:2', 'rate')).toBe('counts=1:2&at=rate');
    expect(withAt(null, 'rate')).toBe('at=rate');
    expect(readAt('#counts=1:2&at=counts-and-law')).toBe('counts-and-law');
    expect(readAt('#counts=1:2')).toBeNull();
    expect(withoutAt('#counts=1:2&at=rate')).toBe('counts=1:2');
    expect(withoutAt('#at=rate')).toBe('');
  });
});
