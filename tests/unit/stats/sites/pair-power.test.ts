import { describe, expect, it } from 'vitest';
import { generator } from '$lib/stats/random/generator';
import { pairPower } from '$lib/stats/sites/pair-power';
import { neighbourShare, type Seek } from '$lib/stats/sites/pair-tests';
import { logFisherP } from '$lib/stats/sites/log-fisher-p';
import { logRiseP } from '$lib/stats/sites/log-rise-p';

const repeats = 2000;

/**
 * Share of simulated pairs of two sites whose p is under what the first step of Holm's rule gives one of `pairs` pairs
 * that share `part` of 5 %: a lower limit of being found, and close to it where no other pair is.
 */
function foundShare(rate: number, seek: Seek, part: number, pairs: number): number {
  const random = generator(31, Math.round(100 * rate));
  const both = rate * rate + 0.05 * rate * (1 - rate);
  let found = 0;
  for (let repeat = 0; repeat < repeats; repeat++) {
    let [n11, n10, n01] = [0, 0, 0];
    for (let shot = 0; shot < 5000; shot++) {
      const u = random.next();
      if (u < both) n11 += 1;
      else if (u < rate) n10 += 1;
      else if (u < 2 * rate - both) n01 += 1;
    }
    const logP = (seek === 'rise' ? logRiseP : logFisherP)(n11, n11 + n10, n11 + n01, 5000);
    if (logP <= Math.log((0.05 * part) / pairs)) found += 1;
  }
  return found / repeats;
}

describe('the chance that a map finds a pair', () => {
  it.each([
    ['any', 0.2],
    ['any', 0.5],
    ['rise', 0.1],
    ['rise', 0.2],
    ['rise', 0.5]
  ] as const)('is near what simulation gives: seeking %s, rate %s', (seek, rate) => {
    const told = pairPower(0.05, { sites: 64, shots: 5000, geometry: 'chain', alpha: 0.05, seek, rate });
    const near = foundShare(rate, seek, neighbourShare[seek], 63);
    const far = foundShare(rate, seek, 1 - neighbourShare[seek], 1953);
    // 3.5 errors of 2000 repeats: 0.039 at a half, 0.032 at 0.2.
    expect(Math.abs(told.neighbour.power - near)).toBeLessThan(0.039);
    expect(Math.abs(told.distant!.power - far)).toBeLessThan(0.032);
  });

  it('is 80 % at the shots that are told, and none where sites never read 1', () => {
    const asked = { sites: 64, geometry: 'chain', alpha: 0.05, seek: 'rise', rate: 0.1 } as const;
    const { neighbour, distant } = pairPower(0.05, { ...asked, shots: 5000 });
    for (const [which, { shots }] of [
      ['neighbour', neighbour],
      ['distant', distant!]
    ] as const)
      expect(pairPower(0.05, { ...asked, shots: shots! })[which]!.power).toBeCloseTo(0.8, 1);
    expect(pairPower(0.05, { ...asked, rate: 0, shots: 5000 }).neighbour).toEqual({ power: 0, shots: null });
    expect(() => pairPower(0, { ...asked, shots: 5000 })).toThrow(RangeError);
  });
});
