import { lawWindow } from '$lib/stats/laws/law-window';
import { generator } from '$lib/stats/random/generator';
import { describe, expect, it } from 'vitest';
import { lawOf, relative } from './enumerate';
import { asDouble, exactPmf } from './exact-pmf';

describe('lawWindow of many trials', () => {
  it.each([
    ['uniform', 512, 1],
    ['uniform', 1000, 1],
    ['with a mean of about 20', 1500, 0.027]
  ])('%s, N = %i, equals whole numbers of any length to 1e-12, down to 1e-290', (_, trials, share) => {
    const random = generator(4, trials);
    const parts = Array.from({ length: trials }, () => 1 + Math.floor(1023 * share * random.next()));
    const { first, values, scale } = lawWindow(lawOf(parts.map((part) => part / 1024)));
    let held = 0;
    exactPmf(parts).forEach((exact, n) => {
      const want = asDouble(exact, trials);
      if (want < 1e-290) return;
      expect(relative(values[n - first] / scale, want), `count ${n}`).toBeLessThan(1e-12);
      held += 1;
    });
    expect(held).toBeGreaterThan(trials / 10);
  });
});
