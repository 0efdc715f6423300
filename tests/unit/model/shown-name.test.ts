import { shownName } from '$lib/model/shown-name';
import { describe, expect, it } from 'vitest';

describe('the name of a file on a page', () => {
  it('turns no writing', () => {
    expect(shownName('\u202egnp.evil\u202c.csv')).toBe('gnp.evil.csv');
    expect(shownName('a\u2066b\u2069\n.csv')).toBe('ab.csv');
  });
  it('keeps letters of any script and joined signs', () => {
    for (const name of ['חבילה.csv', '数据.csv', '👩\u200d🔬.csv']) expect(shownName(name)).toBe(name);
  });
  it('is never empty', () => {
    expect(shownName(' \u202e')).toBe('file without a name');
  });
});
