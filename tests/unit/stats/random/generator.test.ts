import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

describe('generator', () => {
  it('repeats itself, and differs between neighbouring seeds and streams', () => {
    const draw = (seed: number, stream: number) => {
      const stream1 = generator(seed, stream);
      return Array.from({ length: 20 }, () => stream1.uint32());
    };
    expect(draw(7, 3)).toEqual(draw(7, 3));
    const all = [draw(7, 3), draw(8, 3), draw(7, 4), draw(3, 7), draw(7, 3 + 2 ** 32)].flat();
    expect(new Set(all).size).toBe(all.length);
  });

  it('is xoshiro128** on the state that the seed is mixed to', () => {
    // State of (1, 0) from NumPy 2.4.6 SeedSequence([1, 0, 0]).generate_state(4); outputs by the recurrence of
    // Blackman & Vigna 2021 in Python's unbounded integers, which so written gives the published sequence
    // 11520, 0, 5927040, 70819200, 2031721883 from state 1, 2, 3, 4.
    const stream = generator(1, 0);
    expect(Array.from({ length: 6 }, () => stream.uint32())).toEqual([
      2165252233, 295747724, 2969945615, 3693525615, 268919090, 753805953
    ]);
  });

  it('makes one double of two words: 26 high bits of each, then a half', () => {
    const words = generator(5, 9);
    const doubles = generator(5, 9);
    for (let i = 0; i < 100; i++) {
      const high = words.uint32() >>> 6;
      const low = words.uint32() >>> 6;
      expect(doubles.next()).toBe((high * 2 ** 26 + low + 0.5) / 2 ** 52);
    }
    expect(doubles.uint32()).toBe(words.uint32());
  });

  it('is uniform within a stream and across streams', () => {
    const within = new Float64Array(256);
    const across = new Float64Array(256);
    const pairs = new Float64Array(256);
    const stream = generator(11, 0);
    let before = stream.next();
    for (let i = 0; i < 200_000; i++) {
      const u = stream.next();
      within[Math.floor(u * 256)]++;
      pairs[Math.floor(before * 16) * 16 + Math.floor(u * 16)]++;
      before = u;
      across[Math.floor(generator(11, i).next() * 256)]++;
    }
    const flat = new Float64Array(256).fill(1 / 256);
    expect(Math.abs(chiSquareScore(within, flat))).toBeLessThan(4);
    expect(Math.abs(chiSquareScore(across, flat))).toBeLessThan(4);
    expect(Math.abs(chiSquareScore(pairs, flat))).toBeLessThan(4);
  });

  it('refuses what is no seed or stream', () => {
    for (const seed of [-1, 0.5, 2 ** 32, NaN]) expect(() => generator(seed, 0)).toThrow(RangeError);
    for (const stream of [-1, 0.5, 2 ** 53, Infinity]) expect(() => generator(1, stream)).toThrow(RangeError);
  });
});
