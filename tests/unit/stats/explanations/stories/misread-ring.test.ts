import { stories, storiesOn } from '$lib/stats/explanations/stories';
import { describe, expect, it } from 'vitest';
import { everyReading } from '../../misread/every-reading';
import { dense } from '../setting';

const ring = storiesOn('ring-bonds').find(({ id }) => id === 'misread-sites')!;
const setting = {
  trials: 8,
  unit: 'defect',
  geometry: 'ring-bonds',
  last: 6,
  lump: false,
  allEven: true
} as const;

describe('misread sites round a ring', () => {
  it('have the law that counting every even chain and every reading gives', () => {
    for (const [bonds, p, rate] of [
      [3, 0.2, 0.05],
      [7, 0.06, 0.3],
      [8, 0.4, 0]
    ]) {
      const got = dense(ring.window(p, [rate], bonds, bonds), bonds);
      everyReading(new Array<number>(bonds).fill(p), rate, true).forEach((want, n) =>
        expect(Math.abs(got[n] - want)).toBeLessThan(1e-13)
      );
    }
    expect(dense(ring.window(1, [0.01], 5, 5), 5).every((f) => f >= 0)).toBe(true);
  });

  it('start where the ring has the mean seen', () => {
    const p = ring.base(1.9, [0.02], 20);
    const mean = dense(ring.window(p, [0.02], 20, 20), 20).reduce((sum, f, n) => sum + n * f, 0);
    expect(mean).toBeCloseTo(1.9, 8);
  });

  it('are told of single kinks with even counts alone, and elsewhere the chain keeps its place', () => {
    expect(ring.refuses(setting)).toBeNull();
    expect(ring.refuses({ ...setting, unit: 'pair' })).toContain('single kinks');
    expect(ring.refuses({ ...setting, allEven: false })).toContain('odd ones were seen');
    expect(ring.refuses({ ...setting, trials: null })).toContain('number of bonds');
    expect(ring.refuses({ ...setting, trials: 2 })).toContain('three bonds');
    expect(ring.refuses({ ...setting, trials: 5000 })).toContain('too long');
    expect(storiesOn('open-bonds')).toBe(stories);
    expect(storiesOn('ring-bonds').map(({ id }) => id)).toEqual(stories.map(({ id }) => id));
  });
});
