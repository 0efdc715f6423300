import { pointPath } from '$lib/charts/point-path';
import { clipLine } from '$lib/charts/clip-line';
import { linePath } from '$lib/charts/line-path';
import { roundValues } from '$lib/charts/round-values';
import { scaleLinear } from '$lib/charts/scale-linear';
import { scaleLog } from '$lib/charts/scale-log';
import { scaleSymlog } from '$lib/charts/scale-symlog';
import * as d3 from 'd3-scale';
import { line, symbol, symbolCircle, symbolDiamond, symbolTriangle } from 'd3-shape';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

// d3-scale and d3-shape are the second algorithm: the pages draw without them, and must draw the same.
// Not closer than 1/1000: charts have no such domains, and both overflow where ends differ by less than 1e-308.
const finite = fc.integer({ min: -1e9, max: 1e9 }).map((whole) => whole / 1000);
const positive = fc.double({ min: 1e-280, max: 1e6, noNaN: true });
const side = fc.double({ min: 0, max: 900, noNaN: true });

describe('scales', () => {
  it('put every value where d3-scale puts it', () => {
    fc.assert(
      fc.property(finite, finite, side, side, finite, (from, to, start, end, value) => {
        const theirs = d3.scaleLinear([from, to], [start, end])(value);
        const room = 1e-9 * Math.max(1, Math.abs(theirs));
        expect(Math.abs(scaleLinear([from, to], [start, end])(value) - theirs)).toBeLessThanOrEqual(room);
      })
    );
    fc.assert(
      fc.property(positive, positive, side, side, positive, (from, to, start, end, value) => {
        fc.pre(Math.abs(Math.log(from / to)) > 1e-3);
        const theirs = d3.scaleLog([from, to], [start, end])(value);
        const room = 1e-9 * Math.max(1, Math.abs(theirs));
        expect(Math.abs(scaleLog([from, to], [start, end])(value) - theirs)).toBeLessThanOrEqual(room);
      })
    );
  });

  it('straight near 0 and logarithmic far out, as that of d3-scale', () => {
    fc.assert(
      fc.property(finite, finite, side, side, finite, (from, to, start, end, value) => {
        fc.pre(from !== to);
        const theirs = d3.scaleSymlog([from, to], [start, end])(value);
        const room = 1e-9 * Math.max(1, Math.abs(theirs));
        expect(Math.abs(scaleSymlog([from, to], [start, end])(value) - theirs)).toBeLessThanOrEqual(room);
      })
    );
  });

  it('mark the round values that d3-scale marks', () => {
    fc.assert(
      fc.property(finite, finite, fc.integer({ min: 1, max: 30 }), (from, to, count) => {
        expect(roundValues(from, to, count)).toEqual(d3.scaleLinear([from, to], [0, 1]).ticks(count));
      }),
      { numRuns: 2000 }
    );
    const narrow = fc.integer({ min: -2e9, max: 2e9 }).map((whole) => whole / 1e9);
    fc.assert(
      fc.property(narrow, narrow, fc.integer({ min: 1, max: 30 }), (from, to, count) => {
        expect(roundValues(from, to, count)).toEqual(d3.scaleLinear([from, to], [0, 1]).ticks(count));
      }),
      { numRuns: 2000 }
    );
    expect(roundValues(0, 1, 10)).toEqual([0, 0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 1]);
    expect(roundValues(2, 2, 5)).toEqual([2]);
    expect(roundValues(0, 1, 0)).toEqual([]);
  });
});

describe('paths', () => {
  const frame = { left: 0, right: 1000, top: 0, bottom: 1000 };
  const inside = fc.integer({ min: 100, max: 90_000 }).map((whole) => whole / 100);
  const points = fc.uniqueArray(fc.tuple(inside, inside), {
    minLength: 2,
    maxLength: 30,
    selector: ([x]) => Math.round(x * 10)
  });

  it('of lines are those of d3-shape', () => {
    const theirs = line<[number, number]>().digits(2);
    fc.assert(
      fc.property(points, (run) => {
        const across = [...run].sort((a, b) => a[0] - b[0]);
        const runs = clipLine(across, frame);
        expect(linePath(across, frame)).toBe(runs.map((run) => theirs(run)).join(''));
      })
    );
  });

  it.each([
    ['dot', symbolCircle, Math.PI / 4],
    ['up', symbolTriangle, 0.62],
    ['down', symbolTriangle, 0.62],
    ['diamond', symbolDiamond, 0.62]
  ] as const)('of a point (%s) have the corners of d3-shape', (shape, type, fill) => {
    const numbers = (path: string): number[] => (path.match(/-?[\d.]+(?:e-?\d+)?/g) ?? []).map(Number);
    fc.assert(
      fc.property(fc.double({ min: 3, max: 20, noNaN: true }), (size) => {
        const theirs = numbers(symbol(type, fill * size * size)() ?? '');
        const ours = numbers(pointPath([[0, 0]], shape, size));
        expect(ours).toHaveLength(theirs.length);
        const turned = (i: number) => (shape === 'down' && i % 2 ? -1 : 1);
        ours.forEach((value, i) => expect(Math.abs(value - turned(i) * theirs[i])).toBeLessThan(0.0051));
      })
    );
    expect(pointPath([[10, 20]], shape, 6)).not.toBe(pointPath([[0, 0]], shape, 6));
  });
});
