import { clipLine } from '$lib/charts/clip-line';
import { groupCounts } from '$lib/charts/group-counts';
import { hatchEdge } from '$lib/charts/hatch-edge';
import { intervalPath } from '$lib/charts/interval-path';
import { nearestReading } from '$lib/charts/reading/nearest-reading';
import type { Frame, Point } from '$lib/charts/picture';
import { pointPath } from '$lib/charts/point-path';
import { residualOf } from '$lib/charts/residual-of';
import { ruledShade } from '$lib/charts/ruled-shade';
import { standing } from '$lib/charts/standing';
import { standingOfGroup } from '$lib/charts/thinned-marks';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

const frame: Frame = { left: 10, right: 110, top: 20, bottom: 70 };
const inside = ([x, y]: Point) =>
  x >= frame.left - 1e-9 && x <= frame.right + 1e-9 && y >= frame.top - 1e-9 && y <= frame.bottom + 1e-9;
const anyPoint = fc.tuple(
  fc.integer({ min: -200, max: 300 }),
  fc.integer({ min: -200, max: 300 })
) as fc.Arbitrary<Point>;

describe('clipLine', () => {
  it('keeps what is inside as it is', () => {
    const line: Point[] = [
      [10, 20],
      [50, 40],
      [110, 70]
    ];
    expect(clipLine(line, frame)).toEqual([line]);
  });
  it('cuts a line that leaves and comes back into two runs, at the edge', () => {
    expect(
      clipLine(
        [
          [20, 30],
          [20, 10],
          [40, 10],
          [40, 30]
        ],
        frame
      )
    ).toEqual([
      [
        [20, 30],
        [20, 20]
      ],
      [
        [40, 20],
        [40, 30]
      ]
    ]);
  });
  it('breaks at null and drops lone points', () => {
    expect(clipLine([[20, 30], null, [30, 30], [40, 30]], frame)).toEqual([
      [
        [30, 30],
        [40, 30]
      ]
    ]);
  });
  it('never leaves the frame', () => {
    fc.assert(
      fc.property(fc.array(fc.option(anyPoint)), (line) => clipLine(line, frame).flat().every(inside))
    );
  });
});

describe('hatchEdge and ruledShade', () => {
  it('hatch only on the side that is asked for', () => {
    const ys = [
      ...hatchEdge(
        [
          [20, 50],
          [100, 50]
        ],
        'above',
        frame
      ).matchAll(/L[\d.]+,([\d.]+)/g)
    ].map((m) => Number(m[1]));
    expect(ys.length).toBe(11);
    expect(ys.every((y) => y < 50)).toBe(true);
  });
  it('shade stays in its band', () => {
    const numbers = [...ruledShade(frame, 0, 45).matchAll(/[ML]([\d.]+),([\d.]+)/g)].map(
      ([, x, y]): Point => [Number(x), Number(y)]
    );
    expect(numbers.length).toBeGreaterThan(10);
    expect(numbers.every((point) => inside(point) && point[1] <= 45)).toBe(true);
    expect(ruledShade(frame, 0, 5)).toBe('');
  });
});

describe('points and intervals', () => {
  it('a triangle that points down is the one that points up, turned', () => {
    const ys = (d: string) => [...d.matchAll(/[ML][-\d.]+,([-\d.]+)/g)].map((m) => Number(m[1]));
    const up = ys(pointPath([[0, 0]], 'up', 10));
    expect(ys(pointPath([[0, 0]], 'down', 10))).toEqual(up.map((y) => -y));
    expect(Math.min(...up)).toBeLessThan(-4);
  });
  it('an open interval carries an arrow head at its open end', () => {
    expect(intervalPath([{ x: 5, from: 40, to: 20 }])).toBe('M5,40V20');
    expect(intervalPath([{ x: 5, from: 40, to: 20, open: true }])).toBe('M5,40V20M2,25L5,20L8,25');
  });
  it('the nearest reading is nearest across; height decides between neighbours', () => {
    const readings = [
      { x: 0, y: 0, words: () => '' },
      { x: 10, y: 90, words: () => '' },
      { x: 10, y: 0, words: () => '' }
    ];
    expect(nearestReading({ readings, order: 'across' }, 9, 80)).toBe(1);
    expect(nearestReading({ readings, order: 'across' }, 9, 5)).toBe(2);
    expect(nearestReading({ readings, order: 'across' }, 2, 90)).toBe(0);
    expect(nearestReading({ readings, order: 'down' }, 2, 80)).toBe(1);
    expect(nearestReading({ readings: [], order: 'across' }, 1, 1)).toBe(-1);
  });
});

describe('standing and residual', () => {
  const point = { count: 1, density: null, shots: 4, lump: false, observed: 0.4, low: 0.2, high: 0.7 };
  it.each([
    [0.4, 'within', 0],
    [0.3, 'within', 0.5],
    [0.55, 'within', -0.5],
    [0.1, 'more', 1.5],
    [1, 'fewer', -2]
  ] as const)('a law of %f is %s at distance %f', (fitted, stands, distance) => {
    expect(standing({ ...point, fitted })).toBe(stands);
    expect(residualOf({ ...point, fitted })).toBeCloseTo(distance, 12);
  });
  it('a group stands off only when all its outliers do, to one side', () => {
    expect(standingOfGroup(['within', 'more'])).toBe('more');
    expect(standingOfGroup(['more', 'fewer'])).toBe('within');
    expect(standingOfGroup(['within'])).toBe('within');
  });
});

describe('groupCounts', () => {
  it('loses nothing and keeps the order', () => {
    fc.assert(
      fc.property(fc.array(fc.integer()), fc.double({ min: 0.001, max: 20, noNaN: true }), (values, unit) => {
        expect(groupCounts(values, unit, 5).flat()).toEqual(values);
      })
    );
  });
  it('gathers only when marks would touch', () => {
    expect(groupCounts([1, 2, 3], 5, 5)).toEqual([[1], [2], [3]]);
    expect(groupCounts([1, 2, 3], 2.5, 5)).toEqual([[1, 2], [3]]);
  });
});
