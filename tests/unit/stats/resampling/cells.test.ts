import { binomialWindow } from '$lib/stats/laws/binomial-window';
import { cells } from '$lib/stats/resampling/cells';
import { describe, expect, it } from 'vitest';
import { dataOf, plainPmf } from '../fit/plain';

const f = plainPmf(new Array<number>(6).fill(0.4));
const window = binomialWindow(6, 0.4);
const sum = (values: number[]) => values.reduce((a, b) => a + b, 0);

describe('cells', () => {
  it('lays the law over the counts seen, with what lies below and above', () => {
    const { law, below, above } = cells(dataOf({ shots: [0, 0, 5, 3, 1], trials: 6 }), window);
    law.forEach((value, i) => expect(value).toBeCloseTo(f[i + 2], 13));
    expect(below).toBeCloseTo(f[0] + f[1], 13);
    expect(above).toBeCloseTo(f[5] + f[6], 13);
  });

  it('gives a lump what lies above', () => {
    const data = dataOf({ shots: [2, 0, 5, 3], trials: 6, lump: { from: 4, shots: 2 } });
    expect(cells(data, window).above).toBeCloseTo(sum(f.slice(4)), 13);
  });

  it('conditions on n ≥ 1 when empty shots are set aside', () => {
    const data = dataOf({ shots: [9, 0, 5, 3], trials: 6, withoutEmpty: true });
    const { law, below, above } = cells(data, window);
    const some = 1 - f[0];
    expect(law[0]).toBeCloseTo(f[2] / some, 13);
    expect(below).toBeCloseTo(f[1] / some, 13);
    expect(below + sum([...law]) + above).toBeCloseTo(1, 12);
  });

  it('is 0 at counts that the law does not reach', () => {
    const { law, below, above } = cells(
      dataOf({ shots: [0, 4, 0, 2], trials: null }),
      binomialWindow(2, 0.5)
    );
    expect([...law]).toEqual([expect.closeTo(0.5, 13), expect.closeTo(0.25, 13), 0]);
    expect(below).toBeCloseTo(0.25, 13);
    expect(above).toBe(0);
  });
});
