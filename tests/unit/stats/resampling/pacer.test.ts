import { pacer } from '$lib/stats/resampling/pacer';
import { progress } from '$lib/stats/resampling/progress';
import { SequentialP } from '$lib/stats/multiple/sequential-p';
import { describe, expect, it } from 'vitest';

const wait = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

describe('pacer', () => {
  it('tells each step at once, and the share of a loop within the whole', async () => {
    const told: [string, number][] = [];
    const pace = pacer(({ step, share }) => told.push([step, share]));
    await pace.step('fit', 0);
    await pace.step('resampling', 0.1);
    const loop = pace.within(0.1, 0.5);
    await wait(70);
    await loop.breathe(0.5);
    await wait(70);
    await loop.breathe(7);
    expect(told.slice(0, 2)).toEqual([
      ['fit', 0],
      ['resampling', 0.1]
    ]);
    expect(told[2][1]).toBeCloseTo(0.3, 12);
    // Never past the end of the part.
    expect(told[3][1]).toBeCloseTo(0.5, 12);
  });

  it('does not yield, or report, more often than every 60 ms', async () => {
    let told = 0;
    const loop = pacer(() => told++).within(0, 1);
    for (let i = 0; i < 2000; i++) await loop.breathe(i / 2000);
    expect(told).toBeLessThan(20);
  });

  it('rejects with the reason of the signal', async () => {
    const controller = new AbortController();
    const pace = pacer(undefined, controller.signal);
    await pace.step('fit', 0);
    controller.abort(new Error('enough'));
    await expect(pace.step('floor', 0.1)).rejects.toThrow('enough');
  });
});

describe('progress', () => {
  it('goes by draws or by exceedances, whichever is nearer its end', () => {
    const sequence = new SequentialP(1000, 10);
    for (let i = 0; i < 100; i++) sequence.push(i < 5);
    expect(progress(sequence)).toBe(0.5);
    for (let i = 0; i < 600; i++) sequence.push(false);
    expect(progress(sequence)).toBe(0.7);
  });
});
