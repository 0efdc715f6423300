import { formatNumber } from '../../words/format-number';
import { logWalk } from '../log-walk';
import type { Story } from '../story';

/**
 * Common cause: each shot draws its own probability from a beta law, and all trials of the shot share it, so that any
 * two are correlated by ρ. Beta-binomial with variance 1 + (N − 1)ρ ceilings; f_{n+1}/f_n =
 * (N−n)((1−ρ)p + ρn) / ((n+1)((1−ρ)(1−p) + ρ(N−n−1))), which is regular at ρ = 0.
 *
 * N unknown: N → ∞ with θ = Nρ kept, the negative binomial of variance μ(1 + θ), f_{n+1}/f_n = (λ + θn)/((n+1)(1+θ)).
 * Source: Skellam 1948, J. R. Stat. Soc. B 10:257 (m); Greenwood & Yule 1920.
 */
export const commonCause: Story = {
  id: 'common-cause',
  refuses: () => null,
  own: (trials) => [
    trials === null ? { symbol: 'θ', low: 0, high: 1000 } : { symbol: 'ρ', low: 0, high: 0.99 }
  ],
  starts: ({ mean, variance }, trials) => {
    const excess = variance / (trials === null ? mean : mean * (1 - mean / trials)) - 1;
    const whole = Math.max(1e-4, trials === null ? excess : excess / Math.max(1, trials - 1));
    return [[whole], [whole / 5]];
  },
  base: (mean, _own, trials) => (trials === null ? mean : mean / trials),
  window: (base, [strength], trials, upTo) => {
    if (trials === null) {
      const up = (n: number) => (base + strength * n) / ((n + 1) * (1 + strength));
      return logWalk(Math.floor(base), up, Infinity, upTo);
    }
    const [p, q, rest] = [(1 - strength) * base, (1 - strength) * (1 - base), trials - 1];
    const up = (n: number) => ((trials - n) * (p + strength * n)) / ((n + 1) * (q + strength * (rest - n)));
    return logWalk(Math.min(trials, Math.floor(trials * base)), up, trials, upTo);
  },
  meaning: ({ trials, base, own, span }) =>
    trials === null
      ? `Something that all defects of a shot share moves the rate from shot to shot: the variance is ${formatNumber(1 + own[0], 3)} times the mean; excess θ = ${span}.`
      : `Something that all trials of a shot share moves their probability from shot to shot, by ${formatNumber(Math.sqrt(own[0] * base * (1 - base)), 2)} (standard deviation) around ${formatNumber(base, 3)}: any two trials are correlated by ρ = ${span}, however far apart.`
};
