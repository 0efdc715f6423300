import { bestLaw } from '$lib/stats/fit/best-law';
import { emptyExcess, expectedEmpty } from '$lib/stats/resampling/empty-excess';
import { refitted } from '$lib/stats/resampling/refitted';
import { describe, expect, it } from 'vitest';
import { dataOf, plainPmf } from '../fit/plain';

/** 20 000 shots of Bin(9, 0.4) in their expected numbers, and `more` empty ones. */
function withEmpty(more: number) {
  const shots = plainPmf(new Array<number>(9).fill(0.4)).map((f) => Math.round(20_000 * f));
  shots[0] += more;
  const data = dataOf({ shots, trials: 9 });
  return refitted(data, bestLaw(data).levels);
}

describe('empty shots', () => {
  it('expects as many empty shots as the law of the others gives', () => {
    // 0.6^9 · 20 000 = 201.6, whatever was added.
    for (const more of [0, 200, 2000]) expect(expectedEmpty(withEmpty(more))).toBeCloseTo(201.6, -1);
  });

  it('gains nothing when as many are seen as expected, and more the more there are', () => {
    const none = emptyExcess(withEmpty(-10));
    const some = emptyExcess(withEmpty(60));
    const many = emptyExcess(withEmpty(300));
    expect(none).toBeLessThan(0.5);
    expect(some).toBeGreaterThan(2);
    expect(many).toBeGreaterThan(some + 5);
  });

  it('for a far excess is about the root of the deviance of the empty shots alone', () => {
    // The others fix f_0 well here, so h_0 is nearly Poisson about 201.6.
    const seen = 202 + 300;
    const deviance = 2 * (seen * Math.log(seen / 201.6) - (seen - 201.6));
    const found = emptyExcess(withEmpty(300));
    expect(found).toBeGreaterThan(0.6 * Math.sqrt(deviance));
    expect(found).toBeLessThan(1.02 * Math.sqrt(deviance));
  });

  it('says nothing where no shot, or every shot, was empty', () => {
    for (const shots of [[0, 5, 7], [9]]) {
      const data = dataOf({ shots, trials: 4 });
      const of = refitted(data, bestLaw(data).levels);
      expect(emptyExcess(of)).toBe(0);
      expect(expectedEmpty(of)).toBeNull();
    }
  });
});
