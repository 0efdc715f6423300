import { deepScale } from '../../laws/window';
import { formatNumber } from '../../words/format-number';
import type { Story } from '../story';
import { withinBudget } from '../within-budget';

/**
 * Misread sites: kinks on the N bonds of an open chain are independent with probability p; each of the N + 1 sites is
 * misread with probability ε, and toggles both of its bonds. Exact counts by stepping along the chain with "was the
 * last site misread" as the state. Mean N(p + 2ε(1−ε)(1−2p)).
 */
export const misreadSites: Story = {
  id: 'misread-sites',
  refuses: ({ trials, unit, geometry, last, lump }) => {
    if (geometry === 'sites')
      return 'Sites counted one by one stay independent trials when they are misread.';
    if (unit === 'pair') return 'It is for single kinks on an open chain, not for pairs.';
    if (trials === null) return 'It needs the number of bonds.';
    return withinBudget(8 * trials * ((lump ? trials : last) + 1));
  },
  own: () => [{ symbol: 'ε', low: 0, high: 0.5 }],
  starts: () => [[0.002], [0.02], [0.08]],
  base: (mean, [flip], trials) => {
    const toggled = 2 * flip * (1 - flip);
    const share = mean / trials!;
    return Math.min(
      0.99,
      Math.max(share / 50, toggled < 0.45 ? (share - toggled) / (1 - 2 * toggled) : share)
    );
  },
  window: (p, [flip], trials, upTo) => {
    const top = Math.min(trials!, upTo);
    // k kinks read so far, the last site read right, or wrong.
    const right = new Float64Array(top + 1);
    const wrong = new Float64Array(top + 1);
    right[0] = (1 - flip) * deepScale;
    wrong[0] = flip * deepScale;
    for (let bond = 1; bond <= trials!; bond++) {
      for (let k = Math.min(top, bond); k >= 0; k--) {
        const [r, w] = [right[k], wrong[k]];
        const [r1, w1] = k > 0 ? [right[k - 1], wrong[k - 1]] : [0, 0];
        right[k] = (1 - flip) * (r1 * p + r * (1 - p) + w1 * (1 - p) + w * p);
        wrong[k] = flip * (w1 * p + w * (1 - p) + r1 * (1 - p) + r * p);
      }
    }
    for (let k = 0; k <= top; k++) right[k] += wrong[k];
    return { first: 0, values: right, scale: deepScale };
  },
  meaning: ({ percent, base }) =>
    `Kinks are independent, with probability ${formatNumber(base, 2)} a bond, but ${percent} of the sites are misread; each wrong site toggles both of its bonds.`
};
