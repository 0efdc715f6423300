import { generator } from '$lib/stats/random/generator';
import { shuffle } from '$lib/stats/random/shuffle';
import { describe, expect, it } from 'vitest';
import { chiSquareScore } from './chi-square';

describe('shuffle', () => {
  it('gives every order of four numbers the same odds', () => {
    const source = generator(14, 0);
    const seen = new Map<string, number>();
    for (let i = 0; i < 120_000; i++) {
      const values = Float64Array.of(1, 2, 3, 4);
      shuffle(source, values);
      const order = values.join();
      seen.set(order, (seen.get(order) ?? 0) + 1);
    }
    expect(seen.size).toBe(24);
    expect(Math.abs(chiSquareScore([...seen.values()], new Float64Array(24).fill(1 / 24)))).toBeLessThan(4);
  });

  it.each([1000, 2_200_000])('keeps all of %d numbers and moves the first anywhere', (length) => {
    const values = Float64Array.from({ length }, (_, i) => i);
    shuffle(generator(15, length), values);
    const sorted = values.slice().sort();
    expect(sorted.findIndex((value, i) => value !== i)).toBe(-1);
    // The mean place of the first hundred: uniform numbers, standard deviation length/√1200.
    let sum = 0;
    values.forEach((value, place) => (sum += value < 100 ? place : 0));
    expect(Math.abs(sum / 100 - length / 2)).toBeLessThan((4 * length) / Math.sqrt(1200));
  });
});
