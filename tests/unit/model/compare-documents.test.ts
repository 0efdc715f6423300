import { compareDocuments } from '$lib/model/compare-documents';
import { describe, expect, it } from 'vitest';

const before = {
  moments: { mean: { value: 4.05, low: null } },
  tests: [{ p: 0.3 }, { p: 0.5 }],
  format: 'x'
};
const change = (edit: (copy: typeof before) => void) => {
  const copy = structuredClone(before);
  edit(copy);
  return compareDocuments(before, copy);
};

describe('compareDocuments', () => {
  it('finds nothing in the same', () => expect(change(() => {})).toEqual([]));

  it('names path, theirs and ours', () => {
    expect(change((copy) => void (copy.moments.mean.value = 4.050000000000001))).toEqual([
      { path: 'moments.mean.value', theirs: '4.05', ours: '4.050000000000001' }
    ]);
    expect(change((copy) => void (copy.tests[1].p = 0.25))).toEqual([
      { path: 'tests[1].p', theirs: '0.5', ours: '0.25' }
    ]);
    expect(change((copy) => void (copy.format = 'y'))).toEqual([
      { path: 'format', theirs: '"x"', ours: '"y"' }
    ]);
  });

  it('tells of lists of another length, and compares as far as both go', () => {
    expect(change((copy) => void copy.tests.splice(0, 1))).toEqual([
      { path: 'tests.length', theirs: '2', ours: '1' },
      { path: 'tests[0].p', theirs: '0.3', ours: '0.5' }
    ]);
  });

  it('tells of keys that only one has, and of null beside a number', () => {
    expect(compareDocuments({ a: 1, b: null }, { b: 2, c: 3 })).toEqual([
      { path: 'a', theirs: '1', ours: null },
      { path: 'b', theirs: 'null', ours: '2' },
      { path: 'c', theirs: null, ours: '3' }
    ]);
    expect(compareDocuments({ a: [] }, { a: {} })).toEqual([{ path: 'a', theirs: '[]', ours: '{}' }]);
  });
});
