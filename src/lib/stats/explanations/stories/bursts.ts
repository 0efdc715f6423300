import { formatNumber, formatPercent } from '../../words/format-number';
import { baseWindow } from '../base-window';
import { mixture } from '../mixture';
import type { Story } from '../story';

/** A tenth of the shots is no longer rare; half would be two settings. */
const rare = 0.1;

/**
 * Bursts: equal trials, and in a rare share of the shots (at most a tenth) an outside event puts defects on a part h of
 * the other trials too. Two numbers beside the mean, and AIC counts both. N unknown: Poisson counts, h more of them in
 * a burst. As a law it is two settings with unequal shares, and is said to be.
 */
export const bursts: Story = {
  id: 'bursts',
  refuses: () => null,
  own: (trials, { last }) => [
    { symbol: 'share', low: 0, high: rare },
    trials === null
      ? { symbol: 'extra defects', low: 0.01, high: 10 * (last + 1) }
      : { symbol: 'part hit', low: 0.001, high: 1 }
  ],
  starts: ({ mean, last }, trials) => {
    const reach =
      trials === null ? Math.max(0.5, last - mean) : Math.max(0.02, (last - mean) / (trials - mean));
    return [0.3, 0.8].flatMap((part) => [0.001, 0.02].map((share) => [share, part * reach]));
  },
  base: (mean, [share, hit], trials) => {
    // mean = N(p + share·(1−p)·h), or λ + share·h.
    if (trials === null) return Math.max(mean / 2, mean - share * hit);
    return Math.max(mean / (2 * trials), (mean / trials - share * hit) / (1 - share * hit));
  },
  window: (base, [share, hit], trials) =>
    mixture(
      share,
      baseWindow(trials, trials === null ? base + hit : base + (1 - base) * hit),
      baseWindow(trials, base)
    ),
  meaning: ({ trials, own, percent }) =>
    `Now and then, in ${percent} of the shots, something from outside adds ${
      trials === null
        ? `${formatNumber(own[1], 2)} defects on average`
        : `defects on about ${formatPercent(own[1])} of the other trials`
    } at once; all other shots are independent trials. A second setting with so small a share of the shots gives the very same counts: only their order can tell.`
};
