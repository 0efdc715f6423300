import { toHistogram } from '$lib/stats/input/to-histogram';
import { BadInput, type Histogram } from '$lib/stats/types';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const of = (counts: [number, number][], lump: Histogram['lump'] = null): Histogram => ({
  kind: 'histogram',
  counts,
  lump
});

describe('toHistogram', () => {
  it('sums a shot list', () => {
    const shots = [3, 1, 3, 0, 1, 3];
    const want = of([
      [0, 1],
      [1, 2],
      [3, 3]
    ]);
    expect(toHistogram({ kind: 'shots', shots, batches: null })).toEqual(want);
    expect(toHistogram({ kind: 'shots', shots: Uint32Array.from(shots), batches: null })).toEqual(want);
  });

  it('puts rows in order and drops those without shots, a lump without shots too', () => {
    const given = of(
      [
        [4, 2],
        [0, 0],
        [1, 7]
      ],
      { from: 9, shots: 0 }
    );
    expect(toHistogram(given)).toEqual(
      of([
        [1, 7],
        [4, 2]
      ])
    );
    expect(given.counts[0]).toEqual([4, 2]);
  });

  it.each<[string, Histogram, RegExp]>([
    ['a negative count', of([[-1, 3]]), /whole number from 0 up, not -1/],
    ['a fractional count', of([[0.5, 3]]), /not 0\.5/],
    ['a count beyond 2^53', of([[2 ** 60, 3]]), /whole number/],
    ['NaN as a count', of([[NaN, 3]]), /not NaN/],
    ['negative shots', of([[1, -3]]), /number of shots.*not -3 \(count 1\)/],
    ['fractional shots', of([[1, 2.5]]), /number of shots/],
    [
      'a repeated count',
      of([
        [1, 2],
        [1, 3]
      ]),
      /count 1 stands twice/
    ],
    [
      'a lump that overlaps',
      of(
        [
          [1, 2],
          [5, 3]
        ],
        { from: 4, shots: 2 }
      ),
      /inside a row that lumps counts/
    ],
    ['negative shots in the lump', of([[1, 2]], { from: 4, shots: -2 }), /number of shots.*not -2/],
    ['NaN in the lump', of([[1, 2]], { from: 4, shots: NaN }), /number of shots/],
    ['nothing at all', of([]), /no shots/],
    ['rows without shots', of([[3, 0]]), /no shots/],
    [
      'more than 2^53 shots',
      of([
        [0, 2 ** 53 - 1],
        [1, 1]
      ]),
      /2\^53/
    ],
    ['a lump alone', of([], { from: 2, shots: 5 }), /nothing is left/],
    [
      'counts too far apart',
      of([
        [0, 1],
        [20_001, 1]
      ]),
      /from 0 to 20\u202f001; at most 20\u202f000/
    ]
  ])('refuses %s', (_name, data, reason) => {
    expect(() => toHistogram(data)).toThrow(BadInput);
    expect(() => toHistogram(data)).toThrow(reason);
  });

  it('is the identity on what it gives, and keeps every shot', () => {
    fc.assert(
      fc.property(fc.array(fc.nat(30), { minLength: 1, maxLength: 200 }), (shots) => {
        const once = toHistogram({ kind: 'shots', shots, batches: null });
        expect(toHistogram(once)).toEqual(once);
        expect(once.counts.reduce((sum, [, h]) => sum + h, 0)).toBe(shots.length);
        const counts = once.counts.map(([count]) => count);
        expect(counts).toEqual([...counts].sort((a, b) => a - b));
      })
    );
  });
});
