import { formatNumber } from '../../words/format-number';
import { baseWindow } from '../base-window';
import { mixture } from '../mixture';
import type { Story } from '../story';

/**
 * Two settings pooled: half of the shots at p(1 − d), half at p(1 + d). One number, since the halves are taken as
 * equal; unequal shares would be a second one. N unknown: Poisson counts of mean λ(1 ∓ d).
 */
export const twoSettings: Story = {
  id: 'two-settings',
  refuses: () => null,
  own: () => [{ symbol: 'd', low: 0, high: 1 }],
  starts: ({ mean, variance }, trials) => {
    const ceiling = trials === null ? mean : mean * (1 - mean / trials);
    // Var = ceiling + (N² − N)(pd)², or λ²d² when N is unknown.
    const room = trials === null ? mean * mean : mean * mean * (1 - 1 / trials);
    const d = room > 0 ? Math.sqrt(Math.max(0, variance - ceiling) / room) : 0.1;
    return [[Math.min(0.95, Math.max(0.02, d))], [Math.min(0.5, Math.max(0.01, d / 3))]];
  },
  base: (mean, _own, trials) => (trials === null ? mean : mean / trials),
  window: (base, [d], trials) =>
    mixture(0.5, baseWindow(trials, base * (1 - d)), baseWindow(trials, base * (1 + d))),
  meaning: ({ trials, base, own: [d], span }) =>
    `Shots of two settings are pooled: half of them at ${trials === null ? 'a mean of' : 'a probability of'} ${formatNumber(base * (1 - d), 3)}, half at ${formatNumber(base * (1 + d), 3)}; relative shift d = ${span}.`
};
