import { logMisreadTail } from '$lib/stats/misread/log-misread-tail';
import { toggledLaw } from '$lib/stats/misread/toggled-law';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { everyReading } from './every-reading';

describe('logMisreadTail', () => {
  it('holds for any kinks, by counting every chain and every reading', () => {
    const random = generator(21, 0);
    let tightest = Infinity;
    for (let repeat = 0; repeat < 150; repeat++) {
      const bonds = 2 + Math.floor(random.next() * 5);
      const rate = random.next() ** 2 * 0.4;
      const wild = random.next();
      const p = Array.from({ length: bonds }, () =>
        random.next() < 0.3 ? Math.round(random.next()) : wild * random.next()
      );
      const kinks = p.reduce((sum, one) => sum + one, 0);
      const pmf = everyReading(p, rate);
      const toggled = toggledLaw(bonds, rate);
      for (let n = 0; n <= bonds; n++) {
        const upper = pmf.slice(n).reduce((sum, f) => sum + f, 0);
        const lower = pmf.slice(0, n + 1).reduce((sum, f) => sum + f, 0);
        const exact = { low: kinks, high: kinks };
        const wide = { low: Math.max(0, kinks - 0.4), high: Math.min(bonds, kinks + 0.3) };
        for (const [side, tail] of [
          ['high', upper],
          ['low', lower]
        ] as const) {
          const bound = Math.exp(logMisreadTail(side, n, exact, toggled));
          expect(tail).toBeLessThanOrEqual(bound + 1e-12);
          expect(bound).toBeLessThanOrEqual(Math.exp(logMisreadTail(side, n, wide, toggled)) + 1e-12);
          if (tail > 0 && bound < 0.9) tightest = Math.min(tightest, bound / tail);
        }
      }
    }
    expect(tightest).toBeLessThan(1.5);
  });

  it('is the law itself where no kink is possible', () => {
    const toggled = toggledLaw(6, 0.1);
    const none = { low: 0, high: 0 };
    // Counts below the toggled bonds are impossible then; Hoeffding says nothing within one count of the mean.
    const tail = toggled.slice(3).reduce((sum, f) => sum + f, 0);
    expect(Math.exp(logMisreadTail('high', 3, none, toggled))).toBeGreaterThanOrEqual(tail);
    expect(toggled.reduce((sum, f, t) => sum + t * f, 0)).toBeCloseTo(6 * 2 * 0.1 * 0.9, 12);
  });
});
