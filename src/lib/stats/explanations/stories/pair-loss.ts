import { formatNumber } from '../../words/format-number';
import { baseWindow } from '../base-window';
import type { Story } from '../story';
import { withinBudget } from '../within-budget';

/**
 * Pair loss: n₀ ~ Bin(N, p) defects form, or Poisson(λ) of them when N is unknown, and each of the ⌊n₀/2⌋ pairs
 * vanishes with probability a. f_m = Σ_j P(n₀ = m + 2j)·P(Bin(⌊n₀/2⌋, a) = j), all terms positive.
 */
export const pairLoss: Story = {
  id: 'pair-loss',
  refuses: ({ trials, unit, last, allEven }) => {
    if (unit === 'pair') return 'Counted in pairs, a pair that vanishes by itself leaves independent trials.';
    if (allEven) return 'Every count is even, as on a ring: count pairs, n/2 out of N/2, instead.';
    return withinBudget(Math.min(trials ?? Infinity, 4 * (last + 20)) ** 2 / 2);
  },
  // Loss beyond that would need tens of defects formed for one that is read: no longer this story.
  own: (trials) => [{ symbol: 'a', low: 0, high: trials === null ? 0.9 : 0.99 }],
  starts: () => [[0.1], [0.5], [0.85]],
  base: (mean, [a], trials) => {
    // Mean after: μ₀ − a(μ₀ − P(odd)), P(odd) at most ½; a few rounds of it.
    let formed = mean;
    for (let round = 0; round < 20; round++) {
      const odd = (1 - Math.exp(-2 * formed)) / 2;
      formed = Math.min(
        trials === null ? 4 * mean + 10 : 0.98 * trials,
        Math.max(mean, (mean - a * odd) / (1 - a))
      );
    }
    return trials === null ? formed : formed / trials;
  },
  window: (base, [a], trials) => {
    // Each count formed costs as many steps as it has pairs: those that never form are left out.
    const formed = baseWindow(trials, base, 1e-60);
    const end = formed.first + formed.values.length - 1;
    const values = new Float64Array(end + 1);
    const odds = a / (1 - a);
    // Chance that none of the pairs vanishes; from pair to pair, since integer powers must not depend on the machine.
    let none = 1;
    for (let n = 0; n <= end; n++) {
      const pairs = n >> 1;
      if (n > 0 && n % 2 === 0) none *= 1 - a;
      const weight = formed.values[n - formed.first];
      if (!(weight > 0)) continue;
      let part = none * weight;
      for (let j = 0; j <= pairs; j++) {
        values[n - 2 * j] += part;
        part *= ((pairs - j) / (j + 1)) * odds;
      }
    }
    return { first: 0, values, scale: formed.scale };
  },
  meaning: ({ trials, base, span }) =>
    `Defects form independently, ${formatNumber(base * (trials ?? 1), 3)} a shot on average, and then meet and vanish in pairs: each pair is lost with probability a = ${span} before the count is read.`
};
