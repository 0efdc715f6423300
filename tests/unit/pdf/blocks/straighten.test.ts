import { straighten } from '$lib/pdf/blocks/straighten';
import { describe, expect, it } from 'vitest';

const path = (points: number[][]): string => `M${points.map(([x, y]) => `${x},${y}`).join('L')}`;
const pointsOf = (d: string): number[][] =>
  d
    .slice(1)
    .split('L')
    .map((pair) => pair.split(',').map(Number));

describe('straighten', () => {
  it('leaves short paths and curves alone', () => {
    const short = path([
      [0, 0],
      [1, 0],
      [2, 0]
    ]);
    expect(straighten(short)).toBe(short);
    const arcs = 'M0,0A1,1,0,0,1,2,2'.repeat(1000);
    expect(straighten(arcs)).toBe(arcs);
  });

  it('draws a bell of 5 000 points with few, none of the old ones farther off than 0.06 units', () => {
    const points = Array.from({ length: 5000 }, (_, i) => {
      const x = i / 9;
      return [Number(x.toFixed(2)), Number((250 - 200 * Math.exp(-((x - 280) ** 2) / 2000)).toFixed(2))];
    });
    const thin = pointsOf(straighten(path(points)));
    expect(thin.length).toBeLessThan(200);
    expect(thin[0]).toEqual(points[0]);
    expect(thin.at(-1)).toEqual(points.at(-1));
    for (const [x, y] of points) {
      const right = Math.max(
        1,
        thin.findIndex(([tx]) => tx >= x)
      );
      const [[ax, ay], [bx, by]] = [thin[right - 1], thin[right]];
      const slope = (by - ay) / (bx - ax);
      expect(Math.abs(ay + slope * (x - ax) - y) / Math.hypot(1, slope)).toBeLessThan(0.061);
    }
  });

  it('keeps each run of a broken line, and every corner of a saw', () => {
    const saw = Array.from({ length: 1500 }, (_, i) => [i, i % 2 === 0 ? 0 : 5]);
    const two =
      path(saw) +
      path([
        [2000, 1],
        [2001, 1],
        [2002, 1]
      ]);
    expect(straighten(two)).toBe(`${path(saw)}M2000,1L2002,1`);
  });
});
