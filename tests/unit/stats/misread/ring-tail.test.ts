import { logMeanChernoff } from '$lib/stats/bounds/log-mean-chernoff';
import { logMisreadTail } from '$lib/stats/misread/log-misread-tail';
import { ringTail } from '$lib/stats/misread/ring-tail';
import { toggledLaw } from '$lib/stats/misread/toggled-law';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

describe('ringTail', () => {
  it('rests on half the count being a sum of ⌊N/2⌋ independent trials: all zeros are real and not positive', () => {
    const random = generator(31, 0);
    for (let repeat = 0; repeat < 60; repeat++) {
      const bonds = 3 + (repeat % 6);
      const pmf = everyReading(
        Array.from({ length: bonds }, () => 0.02 + 0.96 * random.next()),
        0,
        true
      );
      const half = pmf.filter((_, n) => n % 2 === 0);
      expect(half.length - 1).toBe(Math.floor(bonds / 2));
      // Σ f w^j changes its sign at each of its zeros; on w = −e^t, 400 steps of t a decade.
      let changes = 0;
      let before = 0;
      for (let t = -30; t <= 30; t += 0.00575) {
        const w = -Math.exp(t);
        const sign = Math.sign(half.reduceRight((sum, f) => sum * w + f, 0));
        if (sign !== 0 && before !== 0 && sign !== before) changes++;
        if (sign !== 0) before = sign;
      }
      expect(changes).toBe(Math.floor(bonds / 2));
    }
  });

  it('bounds both tails of what is read, for any kinks, by counting every chain and every reading', () => {
    const random = generator(32, 0);
    let tightest = Infinity;
    for (let repeat = 0; repeat < 150; repeat++) {
      const bonds = 3 + Math.floor(random.next() * 5);
      const rate = random.next() ** 2 * 0.4;
      const wild = random.next();
      const p = Array.from({ length: bonds }, () =>
        random.next() < 0.2 ? 0 : Math.min(0.98, wild * random.next())
      );
      const kinks = everyReading(p, 0, true).reduce((sum, f, n) => sum + n * f, 0);
      const pmf = everyReading(p, rate, true);
      const toggled = toggledLaw(bonds, rate, true);
      const exactly = { low: kinks, high: kinks };
      for (let n = 0; n <= bonds; n++) {
        const upper = pmf.slice(n).reduce((sum, f) => sum + f, 0);
        const lower = pmf.slice(0, n + 1).reduce((sum, f) => sum + f, 0);
        for (const bound of [ringTail(), ringTail(logMeanChernoff)]) {
          const high = Math.exp(logMisreadTail('high', n, exactly, toggled, bound));
          const low = Math.exp(logMisreadTail('low', n, exactly, toggled, bound));
          expect(upper).toBeLessThanOrEqual(high + 1e-12);
          expect(lower).toBeLessThanOrEqual(low + 1e-12);
          if (upper > 0 && high < 0.9) tightest = Math.min(tightest, high / upper);
        }
      }
    }
    expect(tightest).toBeLessThan(1.5);
  });
});
