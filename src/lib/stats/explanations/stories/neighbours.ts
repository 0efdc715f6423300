import { deepScale } from '../../laws/window';
import type { Story } from '../story';
import { withinBudget } from '../within-budget';

/**
 * Neighbour coupling: a stationary two-state Markov chain along the line, which keeps p at every site; neighbours are
 * correlated by c, sites d apart by its d-th power. Exact counts by stepping along the chain with the state of the last
 * site: P(1|1) = p(1−c) + c, P(1|0) = p(1−c). Attraction only, 0 ≤ c < 1.
 *
 * Source: Gabriel 1959, Biometrika 46:454 (m).
 */
export const neighbours: Story = {
  id: 'neighbours',
  refuses: ({ trials, unit, last, lump }) => {
    if (trials === null) return 'It needs the number of sites along the line.';
    if (unit === 'pair') return 'Counted in pairs there is no line of neighbours.';
    if (trials < 2) return 'One trial has no neighbour.';
    return withinBudget(4 * trials * ((lump ? trials : last) + 1));
  },
  own: () => [{ symbol: 'c', low: 0, high: 0.98 }],
  starts: ({ mean, variance }, trials) => {
    const excess = variance / (mean * (1 - mean / trials!)) - 1;
    // (1 + c)/(1 − c) is the limit of long lines.
    const c = Math.min(0.9, Math.max(0.01, excess / (2 + excess)));
    return [[c], [c / 3]];
  },
  base: (mean, _own, trials) => mean / trials!,
  window: (p, [c], trials, upTo) => {
    const stay = p * (1 - c) + c;
    const come = p * (1 - c);
    const top = Math.min(trials!, upTo);
    // Probabilities of "k defects so far, the last site has one" and "… has none".
    const on = new Float64Array(top + 1);
    const off = new Float64Array(top + 1);
    off[0] = (1 - p) * deepScale;
    if (top >= 1) on[1] = p * deepScale;
    for (let site = 1; site < trials!; site++) {
      for (let k = Math.min(top, site + 1); k >= 0; k--) {
        const arrive = k > 0 ? on[k - 1] * stay + off[k - 1] * come : 0;
        off[k] = on[k] * (1 - stay) + off[k] * (1 - come);
        on[k] = arrive;
      }
    }
    for (let k = 0; k <= top; k++) on[k] += off[k];
    return { first: 0, values: on, scale: deepScale };
  },
  meaning: ({ span }) =>
    `A defect makes one on the neighbouring site more likely: neighbours along the line are correlated by c = ${span}, sites d apart by its d-th power.`
};
