import { deepScale } from '../../laws/window';
import { ringEven } from '../../misread/ring-even';
import { ringWindow } from '../../misread/ring-window';
import { formatNumber } from '../../words/format-number';
import type { Story } from '../story';
import { withinBudget } from '../within-budget';

/**
 * Misread sites round a ring: kinks on its N bonds are independent with probability p but for their even total; each of
 * the N sites is misread with probability ε, and toggles both of its bonds. Every count is even (see ringWindow). At
 * ε = 0 it is not equal trials but those with an even total.
 */
export const misreadRing: Story = {
  id: 'misread-sites',
  refuses: ({ trials, unit, allEven }) => {
    if (unit === 'pair')
      return 'It is for single kinks: what a misread does to a pair depends on how far apart its kinks lie.';
    if (!allEven) return 'On a ring misread sites keep every count even, and odd ones were seen.';
    if (trials === null) return 'It needs the number of bonds.';
    if (trials < 3) return 'It needs a ring of three bonds or more.';
    return withinBudget(8 * trials * trials);
  },
  own: () => [{ symbol: 'ε', low: 0, high: 0.5 }],
  starts: () => [[0.002], [0.02], [0.08]],
  base: (mean, [flip], trials) =>
    Math.min(0.99, Math.max(mean / trials! / 50, ringEven(trials!, mean, flip))),
  // A ring of an odd number of bonds cannot hold a kink on each.
  window: (p, [flip], trials) => ringWindow([{ p: Math.min(p, 1 - 1e-9), trials: trials! }], flip, deepScale),
  meaning: ({ percent, base }) =>
    `Kinks are independent but for their even total, with probability ${formatNumber(base, 2)} a bond, but ${percent} of the sites are misread; each wrong site toggles both of its bonds.`
};
