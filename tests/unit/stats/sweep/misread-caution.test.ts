import { misreadCaution } from '$lib/stats/sweep/misread-caution';
import { describe, expect, it } from 'vitest';

const points = (...rates: (number | null | undefined)[]) =>
  rates.map((misread, i) => ({ label: `run ${i + 1}`, ...(misread !== undefined && { misread }) }));

describe('the caution about misreads', () => {
  it('is not there where none are stated, nor in documents that did not say', () => {
    expect(misreadCaution(points(null, 0, undefined))).toEqual([]);
  });

  it.each([
    [points(null, 0.01), /^Misreads are stated for “run 2”, and/],
    [points(0.01, 0.02), /^Misreads are stated for “run 1” and “run 2”, and/],
    [points(0.1, 0.1, 0.1, 0.1), /^Misreads are stated for “run 1”, “run 2”, “run 3” and 1 other, and/],
    [points(0.1, 0.1, 0.1, 0.1, 0.1), /“run 3” and 2 others, and/]
  ])('names the datasets %#', (of, words) => expect(misreadCaution(of)[0]).toMatch(words));

  // From the definition: a read site is its truth or, at the rate, the other; a kink stands between two unlike sites.
  it('says what a misread site does: two bonds flip, so the count changes by −2, 0 or 2', () => {
    const kinks = (ring: number[]) => ring.filter((site, i) => site !== ring[(i + 1) % ring.length]).length;
    const steps = new Set<number>();
    for (let bits = 0; bits < 64; bits++) {
      const ring = Array.from({ length: 6 }, (_, i) => (bits >> i) & 1);
      for (let at = 0; at < 6; at++) steps.add(kinks(ring.with(at, 1 - ring[at])) - kinks(ring));
    }
    expect([...steps].sort((a, b) => a - b)).toEqual([-2, 0, 2]);
  });
});
