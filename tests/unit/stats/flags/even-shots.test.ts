import { bestLaw } from '$lib/stats/fit/best-law';
import { toLaw } from '$lib/stats/fit/trial-levels';
import { evenShots } from '$lib/stats/flags/even-shots';
import { describe, expect, it } from 'vitest';
import { dataOf, plainPmf } from '../fit/plain';
import { lawOf } from '../laws/enumerate';

const p = new Array<number>(12).fill(0.35);
const expected = plainPmf(p).map((f) => Math.round(4000 * f));

describe('evenShots', () => {
  it('counts even shots, and their share under the law: ½(1 + Π(1−2p))', () => {
    const { seen, expected: share } = evenShots(dataOf({ shots: expected, trials: 12 }), lawOf(p));
    expect(seen).toBe(expected.reduce((sum, h, n) => sum + (n % 2 === 0 ? h : 0), 0));
    expect(share).toBeCloseTo((1 + 0.3 ** 12) / 2, 14);
  });

  it('sees that the excess of zeros alone prefers even counts, and that pairing does so at every count', () => {
    const dead = [...expected];
    dead[0] += 500;
    const paired = expected.map((h, n) => Math.round(h * (n % 2 === 0 ? 1.2 : 0.8)));
    for (const [shots, alone] of [
      [dead, true],
      [paired, false]
    ] as const) {
      const data = dataOf({ shots, trials: 12 });
      expect(evenShots(data, toLaw(bestLaw(data).levels)).oneCountAlone).toBe(alone);
    }
  });
});
