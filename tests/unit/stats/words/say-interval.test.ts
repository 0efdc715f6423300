import { sayInterval } from '$lib/stats/words/say-interval';
import { describe, expect, it } from 'vitest';

const thin = '\u202f';

describe('sayInterval', () => {
  it('gives value and interval, and says which end is missing', () => {
    expect(sayInterval({ value: 1.239, low: 1.15, high: 1.33 }, 3)).toBe(`1.24 (95${thin}%: 1.15 to 1.33)`);
    expect(sayInterval({ value: 2, low: 1, high: null }, 2)).toBe(`2.0 (95${thin}%: 1.0 and up)`);
    expect(sayInterval({ value: 2, low: null, high: 3 }, 2)).toBe(`2.0 (95${thin}%: at most 3.0)`);
    expect(sayInterval({ value: 2, low: null, high: null }, 2)).toBe('2.0 (no interval can be given)');
    expect(sayInterval({ value: null, low: null, high: null })).toBe('–');
    expect(sayInterval({ value: 0, low: 0, high: 0.1 }, 2)).toBe(`0 (95${thin}%: 0 to 0.10)`);
  });
});
