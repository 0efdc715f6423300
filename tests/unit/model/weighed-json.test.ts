import fc from 'fast-check';
import { REQUEST_WEIGHT, weighedJson } from '$lib/model/weighed-json';
import { describe, expect, it } from 'vitest';

const bytesOf = (text: string) => new TextEncoder().encode(text);
const read = (text: string, most?: number) => weighedJson(bytesOf(text), most);

describe('weighedJson', () => {
  it('gives what JSON.parse gives, and refuses what it refuses', () => {
    const pieces = ['{', '}', '[', ']', ',', ':', '"a"', '"\\""', '"[{,"', '1e400', '-0', 'null', '\\', '"'];
    const text = fc.oneof(
      fc.jsonValue().map((value) => JSON.stringify(value)),
      fc.array(fc.constantFrom(...pieces), { maxLength: 8 }).map((parts) => parts.join(''))
    );
    fc.assert(
      fc.property(text, (json) => {
        let expected: unknown;
        try {
          expected = { ok: true, value: JSON.parse(json) };
        } catch {
          expected = { ok: false, why: 'It is not JSON.' };
        }
        expect(read(json)).toEqual(expected);
      }),
      { numRuns: 4000 }
    );
  });

  it.each([
    ['a hundred thousand brackets', '['.repeat(100_000) + ']'.repeat(100_000)],
    ['and none that closes', '{"a":'.repeat(100_000)],
    ['65 levels', '['.repeat(65) + ']'.repeat(65)]
  ])('%s: nested too deep', (_, text) => {
    expect(read(text)).toEqual({ ok: false, why: 'Brackets are nested more than 64 deep.' });
  });

  it('64 levels, and brackets within texts, are read', () => {
    expect(read('['.repeat(64) + ']'.repeat(64)).ok).toBe(true);
    expect(read(JSON.stringify('["{'.repeat(100_000)))).toMatchObject({ ok: true });
  });

  it.each([
    ['numbers', `[${'0,'.repeat(REQUEST_WEIGHT)}0]`],
    ['empty objects', `[${'{},'.repeat(REQUEST_WEIGHT / 11)}{}]`],
    ['empty lists beside one another', '[]'.repeat(REQUEST_WEIGHT / 10 + 1)],
    ['keys', `{${'"a":0,'.repeat(REQUEST_WEIGHT)}"a":0}`]
  ])('too many %s', (_, text) => {
    expect(read(text)).toEqual({ ok: false, why: expect.stringContaining('more values') });
    expect(read(text, 10 * REQUEST_WEIGHT)).not.toMatchObject({
      why: expect.stringContaining('more values')
    });
  });

  it.each<[string, Uint8Array]>([
    ['UTF-16', Uint8Array.from(Buffer.from('\ufeff{"a":1}', 'utf16le'))],
    ['bytes that are no UTF-8', Uint8Array.of(0x22, 0xff, 0x22)],
    ['half of a pair, as CESU-8', Uint8Array.of(0x22, 0xed, 0xa0, 0x80, 0x22)],
    ['a zero byte', bytesOf('{"a":1}\0')],
    ['NaN', bytesOf('{"a":NaN}')],
    ['nothing', new Uint8Array()]
  ])('%s is not JSON', (_, bytes) => {
    expect(weighedJson(bytes)).toEqual({ ok: false, why: 'It is not JSON.' });
  });

  it('a mark of order is passed over, and __proto__ stays a key', () => {
    expect(read('\ufeff{"a":1}')).toEqual({ ok: true, value: { a: 1 } });
    const given = read('{"__proto__":{"role":"lead"},"constructor":1}');
    expect(given.ok && Object.keys(given.value as object)).toEqual(['__proto__', 'constructor']);
    expect(given.ok && (given.value as { role?: string }).role).toBeUndefined();
  });
});
