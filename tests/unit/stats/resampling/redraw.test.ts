import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { generator } from '$lib/stats/random/generator';
import { redraw } from '$lib/stats/resampling/redraw';
import { describe, expect, it } from 'vitest';
import { dataOf } from '../fit/plain';
import { chiSquareScore } from '../random/chi-square';

const window = binomialWindow(8, 0.3, 1e-20, 1);

describe('redraw', () => {
  it('draws as many shots as asked, dense from the first to the last count seen', () => {
    const like = dataOf({ shots: [1, 2, 3], trials: 8 });
    const source = redraw(window, like, 200);
    for (let b = 0; b < 50; b++) {
      const drawn = source.draw(generator(3, b));
      expect(drawn.shots.reduce((a, h) => a + h, 0)).toBe(200);
      expect(drawn.shots[0]).toBeGreaterThan(0);
      expect(drawn.shots[drawn.shots.length - 1]).toBeGreaterThan(0);
      expect(drawn).toMatchObject({ trials: 8, total: 200, lump: null, withoutEmpty: false });
    }
  });

  it('follows the law, lump included', () => {
    const like = dataOf({ shots: [1, 2], trials: 8, lump: { from: 3, shots: 4 } });
    const source = redraw(window, like, 1000);
    const seen = [0, 0, 0, 0];
    for (let b = 0; b < 200; b++) {
      const drawn = source.draw(generator(4, b));
      drawn.shots.forEach((h, i) => (seen[drawn.first + i] += h));
      seen[3] += drawn.lump?.shots ?? 0;
      expect(drawn.first + drawn.shots.length).toBeLessThanOrEqual(3);
    }
    const f = Array.from(window.values);
    const lumped = [...f.slice(0, 3), f.slice(3).reduce((a, b) => a + b, 0)];
    expect(Math.abs(chiSquareScore(seen, lumped))).toBeLessThan(4);
  });

  it('does not remember the draw before: the same stream gives the same histogram', () => {
    const source = redraw(window, dataOf({ shots: [1], trials: 8 }), 50);
    const first = source.draw(generator(1, 7));
    const kept = [...first.shots];
    source.draw(generator(1, 8));
    expect([...first.shots]).toEqual(kept);
    expect(source.draw(generator(1, 7))).toEqual(first);
  });
});
