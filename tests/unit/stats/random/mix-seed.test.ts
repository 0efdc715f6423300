import { mixSeed } from '$lib/stats/random/mix-seed';
import { describe, expect, it } from 'vitest';

describe('mixSeed', () => {
  it.each([
    // NumPy 2.4.6: np.random.SeedSequence([seed, stream % 2**32, stream >> 32]).generate_state(4)
    [0, 0, [2968811710, 3677149159, 745650761, 2884920346]],
    [1, 0, [1835504127, 1731038949, 1320224556, 2330041505]],
    [1, 5, [3025039489, 3528014902, 3507927383, 2601490367]],
    [42, 3 * 2 ** 32 + 7, [238172052, 3979388709, 2108472346, 4247550496]],
    [2 ** 32 - 1, 2 ** 53 - 1, [1111932493, 3765380997, 432363180, 747295409]]
  ])('gives NumPy’s words for seed %d, stream %d', (seed, stream, words) => {
    expect([...new Uint32Array(mixSeed(seed, stream))]).toEqual(words);
  });

  it('turns half of the output bits for each input bit turned', () => {
    let turned = 0;
    for (let bit = 0; bit < 32; bit++) {
      const [plain, changed] = [mixSeed(99, 12345), mixSeed(99, (12345 ^ (1 << bit)) >>> 0)];
      for (let i = 0; i < 4; i++) {
        for (let word = (plain[i] ^ changed[i]) >>> 0; word > 0; word >>>= 1) turned += word & 1;
      }
    }
    // 32 flips of 128 bits, each turned with odds ½: standard deviation 32.
    expect(Math.abs(turned - 2048)).toBeLessThan(4 * 32);
  });
});
