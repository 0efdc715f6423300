import { describe, expect, it } from 'vitest';
import fc from 'fast-check';
import type { JsonNode } from '$lib/formats/json/node';
import { parseJson } from '$lib/formats/json/parse-json';

function plain(node: JsonNode): unknown {
  if (node.kind === 'array') return node.items.map(plain);
  if (node.kind === 'object')
    return Object.fromEntries(node.members.map(({ key, value }) => [key, plain(value)]));
  return node.kind === 'number' ? Number(node.raw) : node.value;
}
const error = (text: string) => {
  const parsed = parseJson(text, 1e6);
  return parsed.ok ? null : parsed.error;
};

describe('parseJson', () => {
  it('agrees with JSON.parse on every JSON value', () => {
    fc.assert(
      fc.property(fc.jsonValue(), fc.constantFrom(0, 2), (value, indent) => {
        const text = JSON.stringify(value, null, indent);
        const parsed = parseJson(text, 1e6);
        expect(parsed.ok && plain(parsed.root)).toEqual(JSON.parse(text));
      })
    );
  });

  it('refuses what JSON.parse refuses, and nothing else but NaN, Infinity and depth', () => {
    const piece = fc.constantFrom(
      '{',
      '}',
      '[',
      ']',
      ',',
      ':',
      '"a"',
      '1',
      '-',
      '0',
      '.5',
      'e1',
      'null',
      ' ',
      '"',
      '\\'
    );
    fc.assert(
      fc.property(
        fc.array(piece, { maxLength: 8 }).map((parts) => parts.join('')),
        (text) => {
          let valid = true;
          try {
            JSON.parse(text);
          } catch {
            valid = false;
          }
          expect(parseJson(text, 1e6).ok).toBe(valid);
        }
      ),
      { numRuns: 3000 }
    );
  });

  it('keeps repeated keys, digits and __proto__', () => {
    const parsed = parseJson('{"0": 1, "0": 9007199254740993, "__proto__": 2}', 100);
    expect(parsed).toMatchObject({
      root: {
        members: [{ key: '0' }, { key: '0', value: { raw: '9007199254740993' } }, { key: '__proto__' }]
      }
    });
  });

  it.each([
    ['{"a":1,}', 7, 'comma'],
    ["{'a':1}", 1, "'"],
    ['{0: 1}', 1, 'key'],
    ['{"a": 012}', 6, 'zero'],
    ['[1, 2', 5, 'ends'],
    ['{"a" 1}', 5, 'colon'],
    ['[1] [2]', 4, 'more text'],
    ['["abc', 1, 'quotation']
  ])('says where %j is wrong', (text, at, word) => {
    expect(error(text)?.at).toBe(at);
    expect(error(text)?.message).toContain(word);
  });

  it('stops at depth and number of values without overflowing', () => {
    expect(error('['.repeat(1_000_000))?.message).toContain('64');
    expect(error('{"a":'.repeat(1_000_000))?.message).toContain('64');
    expect(parseJson('[1,2,3]', 3).ok).toBe(false);
  });
});
