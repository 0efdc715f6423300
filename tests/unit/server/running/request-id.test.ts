import { requestId } from '$lib/server/running/request-id';
import { describe, expect, it } from 'vitest';

describe('requestId', () => {
  it('takes the one of a proxy, and of nobody else', () => {
    expect(requestId('proxy-4711.a_b', true)).toBe('proxy-4711.a_b');
    expect(requestId('proxy-4711.a_b', false)).toMatch(/^[\da-f]{16}$/);
  });

  it.each([
    undefined,
    '',
    'short',
    'a'.repeat(65),
    'two words',
    'line\nend12',
    '<script>1',
    ['abcdefgh', 'abcdefgh']
  ])('makes one where %j came', (given) => expect(requestId(given, true)).toMatch(/^[\da-f]{16}$/));

  it('makes a new one each time', () => {
    expect(new Set(Array.from({ length: 1000 }, () => requestId(undefined, false))).size).toBe(1000);
  });
});
